'use client';

import { CautionNote } from '@/app/_components/caution-note';
import { QuantityField } from '@/app/_components/quantity-field';
import { SelectField } from '@/app/_components/select-field';
import { tierName } from '@/app/_components/section/tier-names';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { currencySymbol } from '@/lib/format/money';
import type { LandingCrop } from './landing-tent';

interface LandingWordsProps {
  doc: ScenarioDocument;
  crops: readonly LandingCrop[];
  onChange: (doc: ScenarioDocument) => void;
}

const keyOf = ({ crop, stage }: { crop: string; stage: string }) => `${crop} · ${stage}`;

/** The coldest month of the room; moving it moves the whole year, so that its shape stays. */
function coldest(doc: ScenarioDocument): number {
  const { airTempC } = doc.room;
  return airTempC.kind === 'constant' ? airTempC.value : Math.min(...airTempC.values);
}

function withColdest(doc: ScenarioDocument, coldC: number): ScenarioDocument {
  const { airTempC } = doc.room;
  const by = coldC - coldest(doc);
  const moved =
    airTempC.kind === 'constant'
      ? { ...airTempC, value: coldC }
      : { ...airTempC, values: airTempC.values.map((value) => Math.round((value + by) * 10) / 10) };
  return { ...doc, room: { ...doc.room, airTempC: moved } };
}

/** The four things that a stranger would change first. */
export function LandingWords({ doc, crops, onChange }: LandingWordsProps) {
  const { tariff } = doc.power;
  const downward = [...doc.tiers].sort((a, b) => b.topHeightM - a.topHeightM);
  return (
    <div className="flex h-full flex-col justify-between gap-6 pt-60 max-[1179px]:pt-1 max-[1179px]:pb-4">
      <div>
        <div className="grid max-w-110 grid-cols-2 gap-x-5 gap-y-4 min-[1180px]:max-[1399px]:grid-cols-1 max-md:grid-cols-1">
          {downward.map((tier) => (
            <SelectField
              key={tier.id}
              className="w-full"
              label={`${tierName(doc.tiers, tier.id)} grows`}
              value={tier.target ? keyOf(tier.target) : ''}
              options={crops.map((each) => ({ value: keyOf(each), label: each.crop }))}
              onChange={(key) => {
                const target = crops.find((each) => keyOf(each) === key)?.target ?? null;
                onChange({
                  ...doc,
                  tiers: doc.tiers.map((each) => (each.id === tier.id ? { ...each, target } : each)),
                });
              }}
            />
          ))}
          <QuantityField
            className="w-full"
            label="Cellar air, coldest month"
            kind="temperature"
            value={coldest(doc)}
            min={-20}
            max={30}
            step={0.5}
            onCommit={(coldC) => onChange(withColdest(doc, coldC))}
          />
          {tariff.kind === 'flat' && (
            <QuantityField
              className="w-full"
              label="A kWh costs"
              kind="ratio"
              unit={currencySymbol(tariff.currency)}
              value={tariff.pricePerKwh}
              min={0}
              max={5}
              onCommit={(pricePerKwh) =>
                onChange({ ...doc, power: { ...doc.power, tariff: { ...tariff, pricePerKwh } } })
              }
            />
          )}
        </div>
      </div>
      <CautionNote
        text="The heater stands in the room, a metre clear of the fabric, and warms the air that is drawn in. What its own label asks for comes first."
        source="A planning estimate; local codes and a licensed electrician decide."
      />
    </div>
  );
}
