'use client';

import { CautionNote } from '@/app/_components/caution-note';
import { AmpereBar } from '@/app/_components/chart/ampere-bar';
import { Choice } from '@/app/_components/choice';
import { QuantityField } from '@/app/_components/quantity-field';
import { TextField } from '@/app/_components/text-field';
import type { Room } from '@/lib/rooms/room.schema';
import type { RoomPartProps } from './room-view';

type Circuit = Room['power']['circuits'][number];

const freshId = (circuits: readonly Circuit[]) => {
  let n = circuits.length + 1;
  while (circuits.some((circuit) => circuit.id === `circuit-${n}`)) n += 1;
  return `circuit-${n}`;
};

export function CircuitsPart({ room, change, readOnly }: RoomPartProps) {
  const { power } = room;
  const put = (circuits: Circuit[]) => change({ power: { ...power, circuits } });
  const edit = (id: string, patch: Partial<Circuit>) =>
    put(power.circuits.map((circuit) => (circuit.id === id ? { ...circuit, ...patch } : circuit)));
  return (
    <section>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-2">
        <h2 className="text-22">Circuits</h2>
        <QuantityField
          label="Supply"
          kind="voltage"
          className="w-28"
          min={90}
          max={420}
          value={power.supplyV}
          disabled={readOnly}
          onCommit={(supplyV) => change({ power: { ...power, supplyV } })}
        />
      </div>
      {power.circuits.length === 0 && (
        <p className="pt-3 text-14">
          None yet. Add the one that the tent will hang on; its rating stands on the breaker.
        </p>
      )}
      {power.circuits.map((circuit) => (
        <div key={circuit.id} className="border-b border-line py-4">
          <div className="flex flex-wrap items-start gap-4">
            <TextField
              label="Circuit"
              value={circuit.name}
              maxLength={60}
              className="w-44"
              disabled={readOnly}
              onChange={(name) => edit(circuit.id, { name: name === '' ? ' ' : name.trimStart() })}
            />
            <QuantityField
              label="Breaker"
              kind="current"
              className="w-24"
              min={1}
              max={200}
              value={circuit.ratingA}
              disabled={readOnly}
              onCommit={(ratingA) => edit(circuit.id, { ratingA })}
            />
            <QuantityField
              label="Other things on it"
              kind="power"
              className="w-40"
              min={0}
              max={50_000}
              value={circuit.otherLoadsW ?? 0}
              isDefault={circuit.otherLoadsW === undefined}
              defaultReason="Washers, freezers, lamps of the house. For safety, count what could run."
              onConfirmDefault={() => edit(circuit.id, { otherLoadsW: 0 })}
              disabled={readOnly}
              derived={circuit.otherLoadsW ? `${(circuit.otherLoadsW / power.supplyV).toFixed(1)} A` : undefined}
              onCommit={(otherLoadsW) => edit(circuit.id, { otherLoadsW })}
            />
            {!readOnly && (
              <button
                type="button"
                className="link-opens mt-5 min-h-6 text-12"
                onClick={() => put(power.circuits.filter((each) => each.id !== circuit.id))}
              >
                Take it out
              </button>
            )}
          </div>
          <AmpereBar
            pieces={
              circuit.otherLoadsW
                ? [{ key: 'other', words: 'other things', amps: circuit.otherLoadsW / power.supplyV, look: 'other' }]
                : []
            }
            ratingA={circuit.ratingA}
            limitA={0.8 * circuit.ratingA}
            label={`${circuit.name}: breaker ${circuit.ratingA} A, ${(0.8 * circuit.ratingA).toFixed(1)} A for loads of three hours or more`}
          />
        </div>
      ))}
      {!readOnly && (
        <button
          type="button"
          className="link-does mt-3 min-h-6 text-14"
          onClick={() =>
            put([
              ...power.circuits,
              { id: freshId(power.circuits), name: 'Sockets', ratingA: power.supplyV < 200 ? 15 : 16 },
            ])
          }
        >
          Add a circuit
        </button>
      )}
      <div className="pt-5">
        <Choice
          label="Residual-current or ground-fault device of 30 mA or less"
          value={room.residualCurrentDevice}
          disabled={readOnly}
          options={[
            { value: 'yes', label: 'Yes' },
            { value: 'no', label: 'No' },
            { value: 'unknown', label: 'I don’t know' },
          ]}
          onChange={(residualCurrentDevice) => change({ residualCurrentDevice })}
        />
        {room.residualCurrentDevice !== 'yes' && (
          <div className="pt-3">
            <CautionNote
              severity="warning"
              text={
                room.residualCurrentDevice === 'no'
                  ? 'Water stands beside mains here, with nothing that cuts the current when it finds a way through a person. Have one fitted by a licensed electrician before you plug in; local code decides.'
                  : 'Water stands beside mains here. Until you know, it counts as missing. Ask a licensed electrician; local code decides.'
              }
              source="Electrical Safety Foundation International; BS 7671 411.3.3"
            />
          </div>
        )}
        <p className="max-w-[36rem] pt-3 text-12 text-ink-soft">
          80 % of the breaker for loads of three hours or more is North American practice (NEC 210.19 to 210.23); on 230
          V it is planning advice, not a rule. Local code and a licensed electrician decide.
        </p>
      </div>
    </section>
  );
}
