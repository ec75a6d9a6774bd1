import { sources } from '../sources';
import type { Caution } from './evaluation-document';
import { limitShareText, rounded, type CautionFacts } from './cautions';

function overloads({ scenario, circuits }: CautionFacts): Caution[] {
  const american = scenario.power.supplyV < 200;
  return circuits.flatMap((circuit, index): Caution[] => {
    if (circuit.within) return [];
    const ratingA = scenario.power.circuits[index]!.ratingA;
    const overRating = circuit.peakA > ratingA;
    return [
      {
        code: overRating ? 'circuit.overRating' : 'circuit.overContinuous',
        severity: 'danger',
        where: `power.circuits.${circuit.id}`,
        text: overRating
          ? `All that hangs on this circuit draws ${rounded(circuit.peakA, 1)} A; its breaker is for ${rounded(ratingA)} A. Move something to another circuit.`
          : `Loads that run three hours or more draw ${rounded(circuit.continuousA, 1)} A; ${limitShareText} of the ${rounded(ratingA)} A breaker is ${rounded(circuit.limitA, 1)} A. ${american ? 'Move something to another circuit.' : 'On 230 V this is planning advice, not a rule; local code decides.'} A licensed electrician can tell what the wiring bears.`,
        source: american ? sources.NEC210.citation : `${sources.NEC210.citation}, North American practice`,
      },
    ];
  });
}

/** Mains beside water, loads on circuits. */
export function electricalCautions(facts: CautionFacts): Caution[] {
  const { scenario, heat, circuits } = facts;
  const wet = scenario.water.pumpW > 0 || scenario.water.reservoirL > 0;
  const powered = scenario.placements.length > 0 || scenario.climate.heater !== null || scenario.water.pumpW > 0;
  const cautions = overloads(facts);
  if (circuits.length === 0 && powered) {
    cautions.push({
      code: 'circuit.unknown',
      severity: 'warning',
      where: 'power.circuits',
      text: 'No circuit is given, so nobody has checked what the wiring bears. Read the rating off the breaker and add what else hangs on it.',
      source: sources.NEC210.citation,
    });
  } else if (heat.recommendedHeaterW > 0 && heat.recommendedHeaterCircuit === null) {
    cautions.push({
      code: 'circuit.noneForHeater',
      severity: 'warning',
      where: 'climate.heater',
      text: `No circuit here carries the ${rounded(heat.recommendedHeaterW)} W heater that the coldest night asks for, beside what hangs on it already. Insulate, warm the room by other means, or ask an electrician for a circuit of its own.`,
      source: sources.NEC210.citation,
    });
  }
  if (wet && powered) {
    cautions.push(
      {
        code: 'water.residualCurrent',
        severity: 'warning',
        where: 'power',
        text: 'Water stands beside mains. Power everything here through a residual-current or ground-fault device of 30 mA or less; if it trips, stop and have the equipment checked. Local code and a licensed electrician decide.',
        source: `${sources.ESFI.citation}; ${sources.BS7671.citation}`,
      },
      {
        code: 'water.dripLoop',
        severity: 'note',
        where: 'water',
        text: 'Let every cable hang below its socket before it rises to it, and mount strips and drivers above the highest water level, where no tray can drain on them.',
        source: 'Recalled, unconfirmed: advice common for aquaria',
      },
    );
  }
  cautions.push({
    code: 'plan.estimate',
    severity: 'note',
    where: 'power',
    text: 'This is a planning estimate. Local codes, makers’ instructions and a licensed electrician decide.',
    source: 'Ours',
  });
  return cautions;
}
