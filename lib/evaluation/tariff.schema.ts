import { z } from 'zod';
import { clockEnd, clockTime, currencyCode, expecting, flag, list, misfit, oneOf, quantity } from './fields';

const price = () => quantity({ min: -10, max: 1000, unit: 'a kWh' });
const tariffCommon = {
  currency: currencyCode,
  fixedPerMonth: quantity({ min: 0, max: 1e6, unit: 'a month' }).optional(),
  taxPct: quantity({ min: 0, max: 100, unit: '%' }).optional(),
  householdBaseKwhPerMonth: quantity({ min: 0, max: 1e6, unit: 'kWh' }).optional(),
};

export const tariffPeriodSchema = z.strictObject({
  price: price(),
  weekdays: oneOf(['all', 'weekday', 'weekend']).optional(),
  from: clockTime,
  to: clockEnd,
  months: list(quantity({ min: 1, max: 12, unit: '', integer: true }), { least: 1, most: 12 }).optional(),
});

export const tariffSchema = z.discriminatedUnion(
  'kind',
  [
    z.strictObject({ ...tariffCommon, kind: z.literal('flat'), pricePerKwh: price() }),
    z.strictObject({
      ...tariffCommon,
      kind: z.literal('timeOfUse'),
      periods: list(tariffPeriodSchema, { most: 48 }),
      otherwise: price(),
    }),
    z
      .strictObject({
        ...tariffCommon,
        kind: z.literal('tiered'),
        tiers: list(
          z.strictObject({ upToKwh: quantity({ min: 0, max: 1e6, unit: 'kWh' }).optional(), price: price() }),
          { least: 1, most: 12 },
        ),
        prorateByDays: flag().optional(),
      })
      .superRefine(({ tiers }, context) => {
        tiers.forEach((tier, index) => {
          const last = index === tiers.length - 1;
          const before = tiers[index - 1]?.upToKwh ?? 0;
          if (last && tier.upToKwh !== undefined)
            context.addIssue(
              misfit({
                path: ['tiers', index, 'upToKwh'],
                message: 'The last step has no end: leave upToKwh out.',
                range: 'left out',
                unit: 'kWh',
              }),
            );
          if (!last && (tier.upToKwh === undefined || tier.upToKwh <= before))
            context.addIssue(
              misfit({
                path: ['tiers', index, 'upToKwh'],
                message: `This step must end above ${before} kWh.`,
                range: `above ${before}`,
                unit: 'kWh',
              }),
            );
        });
      }),
  ],
  {
    error: expecting('Give a tariff of kind flat, timeOfUse or tiered.', {
      range: 'kind flat, timeOfUse or tiered',
      unit: '',
    }),
  },
);
