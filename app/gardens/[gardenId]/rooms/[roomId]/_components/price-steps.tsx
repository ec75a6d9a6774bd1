'use client';

import { CheckField } from '@/app/_components/check-field';
import { QuantityField } from '@/app/_components/quantity-field';
import type { Tariff } from '@/lib/evaluation/evaluate-scenario';

type Stepped = Extract<Tariff, { kind: 'tiered' }>;

interface PriceStepsProps {
  tariff: Stepped;
  put: (tariff: Stepped) => void;
  readOnly: boolean;
  currency: string;
}

/** Prices that rise with the month's sum: each step ends where the next begins, the last has no end. */
export function PriceSteps({ tariff, put, readOnly, currency }: PriceStepsProps) {
  const { tiers } = tariff;
  const edit = (at: number, patch: Partial<Stepped['tiers'][number]>) =>
    put({ ...tariff, tiers: tiers.map((tier, index) => (index === at ? { ...tier, ...patch } : tier)) });
  return (
    <div className="flex flex-col gap-3 pt-4">
      {tiers.map((tier, at) => {
        const before = tiers[at - 1]?.upToKwh ?? 0;
        const last = at === tiers.length - 1;
        return (
          <div key={at} className="flex flex-wrap items-start gap-3">
            <QuantityField
              label={at === 0 ? 'From the first kWh' : `Above ${before} kWh`}
              kind="ratio"
              unit={currency}
              className="w-40"
              min={-10}
              max={1000}
              value={tier.price}
              disabled={readOnly}
              onCommit={(price) => edit(at, { price })}
            />
            {last ? (
              <p className="pt-6 text-14 text-ink-soft">without end</p>
            ) : (
              <QuantityField
                label="up to, a month"
                kind="energy"
                className="w-36"
                min={before + 1}
                max={tiers[at + 1]?.upToKwh !== undefined ? tiers[at + 1]!.upToKwh! - 1 : 1e6}
                value={tier.upToKwh ?? before + 100}
                disabled={readOnly}
                onCommit={(upToKwh) => edit(at, { upToKwh })}
              />
            )}
            {!readOnly && tiers.length > 1 && (
              <button
                type="button"
                className="link-opens mt-5 min-h-6 text-12"
                onClick={() => {
                  const rest = tiers.filter((_, index) => index !== at);
                  put({
                    ...tariff,
                    tiers: rest.map((each, index) => (index === rest.length - 1 ? { price: each.price } : each)),
                  });
                }}
              >
                Take it out
              </button>
            )}
          </div>
        );
      })}
      {!readOnly && (
        <button
          type="button"
          className="link-does min-h-6 self-start text-14"
          onClick={() => {
            const end = (tiers.at(-2)?.upToKwh ?? 0) + 200;
            put({
              ...tariff,
              tiers: [
                ...tiers.slice(0, -1),
                { upToKwh: end, price: tiers.at(-1)!.price },
                { price: tiers.at(-1)!.price },
              ],
            });
          }}
        >
          Add a step
        </button>
      )}
      <CheckField
        label="Steps follow the days of the month, 30 days to a month"
        checked={tariff.prorateByDays === true}
        disabled={readOnly}
        onChange={(prorateByDays) => put({ ...tariff, prorateByDays })}
      />
    </div>
  );
}
