'use client';

import { AmpereBar, type AmperePiece } from '@/app/_components/chart/ampere-bar';
import { Explainable } from '@/app/_components/explain';
import { Figure } from '@/app/_components/figure';
import type { CircuitResult, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { Workbench } from '@/lib/scenarios/scenario.schema';

/** Amperes by what draws them, as the physics reckons them: lamps with their power factor, the rest without. */
function piecesOf(document: ScenarioDocument, circuitId: string, own: number): AmperePiece[] {
  const { supplyV, circuits } = document.power;
  const circuit = circuits.find((each) => each.id === circuitId)!;
  const named = new Set(circuits.flatMap((each) => each.carries));
  const lamps = document.placements
    .filter((placement) =>
      named.has(placement.id) ? circuit.carries.includes(placement.id) : circuit.carries.includes('light'),
    )
    .reduce((sum, placement) => {
      const fixture = document.fixtures.find((each) => each.id === placement.fixture);
      return sum + (fixture ? fixture.inputPowerW / (supplyV * (fixture.powerFactor ?? 0.95)) : 0);
    }, 0);
  const amps = (kind: string, watts: number) => (circuit.carries.includes(kind) ? watts / supplyV : 0);
  const heater = amps('heater', document.climate.heater?.ratedPowerW ?? 0);
  const fans =
    amps('exhaust', document.climate.exhaust?.inputPowerW ?? 0) +
    amps('circulation', document.climate.circulation?.inputPowerW ?? 0) +
    amps('pump', document.water?.pump?.inputPowerW ?? 0);
  const other = Math.max(0, own - lamps - heater - fans);
  const pieces: AmperePiece[] = [
    { key: 'lamps', words: 'lamps', amps: lamps, look: 'lamps' },
    { key: 'heater', words: 'heater', amps: heater, look: 'heater' },
    { key: 'fans', words: 'fans, pump', amps: fans, look: 'fans' },
    { key: 'other', words: 'other things', amps: other, look: 'other' },
  ];
  return pieces.filter((piece) => piece.amps > 0.005);
}

interface CircuitPartProps {
  workbench: Workbench;
  document: ScenarioDocument;
  circuit: CircuitResult;
}

export function CircuitPart({ workbench, document, circuit }: CircuitPartProps) {
  const given = workbench.room.power.circuits.find((each) => each.id === circuit.id)!;
  const spare = circuit.limitA - circuit.continuousA;
  return (
    <section className="pt-6">
      <h3 className="text-17">
        {given.name}{' '}
        <span className="text-ink-soft">
          {document.power.supplyV} V, {given.ratingA} A
        </span>
      </h3>
      <AmpereBar
        pieces={piecesOf(document, circuit.id, circuit.peakA)}
        ratingA={given.ratingA}
        limitA={circuit.limitA}
        label={`${circuit.peakA.toFixed(1)} A of ${given.ratingA} A at most, ${circuit.continuousA.toFixed(1)} A of ${circuit.limitA.toFixed(1)} A for three hours or more`}
      />
      <p className="pt-2 text-14">
        What runs three hours or more draws{' '}
        <Explainable path={`circuits.${circuit.id}.continuous`}>
          <Figure value={circuit.continuousA} kind="current" bold />
        </Explainable>
        {circuit.within ? (
          <>
            , within <Figure value={circuit.limitA} kind="current" />: {spare.toFixed(1)} A to spare.
          </>
        ) : (
          <span className="font-semibold text-ember-ink">
            {' '}
            and everything together <Figure value={circuit.peakA} kind="current" />: too much for this circuit.
          </span>
        )}
      </p>
    </section>
  );
}
