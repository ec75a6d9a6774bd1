import { describe, expect, it } from 'vitest';
import { priceAt, tentCost, tieredCharge } from '@/physics/power/bill';
import { circuitLoad } from '@/physics/power/circuit-load';
import type { Tariff } from '@/physics/plan/scenario-document';

const load = (powerW: number, powerFactor = 1, continuous = true) => ({ powerW, powerFactor, continuous });

// NEC 210.20(A): continuous loads within 80 % of the rating; exact arithmetic.
describe('circuit load', () => {
  it('finds a 1,500 W heater at 120 V over the 12 A of a 15 A circuit and within the 16 A of a 20 A one', () => {
    expect(circuitLoad({ loads: [load(1500)], supplyV: 120, ratingA: 15 })).toEqual({
      peakA: 12.5,
      continuousA: 12.5,
      limitA: 12,
      within: false,
    });
    expect(circuitLoad({ loads: [load(1500)], supplyV: 120, ratingA: 20 }).within).toBe(true);
  });
  it('adds 400 W of lamps at power factor 0.95, 1,500 W and 30 W to 16.26 A at 120 V', () =>
    expect(
      circuitLoad({ loads: [load(400, 0.95), load(1500), load(30)], supplyV: 120, ratingA: 20 }).continuousA,
    ).toBeCloseTo(16.2588, 4));
  it('takes 43.75 A for 10,500 W at 240 V (published example of the code)', () =>
    expect(circuitLoad({ loads: [load(10_500)], supplyV: 240, ratingA: 60 }).continuousA).toBe(43.75));
  it('leaves short runs out of the long load and in the whole', () => {
    const { peakA, continuousA } = circuitLoad({ loads: [load(1200), load(600, 1, false)], supplyV: 120, ratingA: 20 });
    expect([peakA, continuousA]).toEqual([15, 10]);
  });
});

const tiers: Extract<Tariff, { kind: 'tiered' }> = {
  kind: 'tiered',
  currency: 'USD',
  tiers: [{ upToKwh: 500, price: 0.12 }, { price: 0.18 }],
  fixedPerMonth: 12,
  taxPct: 7,
};

// Exact arithmetic, worked by hand.
describe('bill', () => {
  it('bills 700 kWh on steps of 500 at 115.56 with charge and tax', () =>
    expect(tentCost({ tariff: tiers, energyKwh: 700, clockCharge: 0, daysInMonth: 30 })).toBeCloseTo(115.56, 2));
  it('moves the steps with the days of the month: 114.49 in 31 days', () =>
    expect(
      tentCost({ tariff: { ...tiers, prorateByDays: true }, energyKwh: 700, clockCharge: 0, daysInMonth: 31 }),
    ).toBeCloseTo(114.49, 2));
  it('charges the tent what it adds: 250 kWh on 450 cost 42.00', () =>
    expect(
      tieredCharge({ energyKwh: 700, tariff: tiers, daysInMonth: 30 }) -
        tieredCharge({ energyKwh: 450, tariff: tiers, daysInMonth: 30 }),
    ).toBeCloseTo(42, 10));
  it('lets the first matching period count, through midnight too', () => {
    const tariff: Tariff = {
      kind: 'timeOfUse',
      currency: 'EUR',
      otherwise: 0.2,
      periods: [
        { price: 0.1, from: '22:00', to: '06:00' },
        { price: 0.4, weekdays: 'weekday', from: '16:00', to: '21:00', months: [1] },
      ],
    };
    expect(priceAt(tariff, { month: 6, weekday: 3, minute: 23 * 60 })).toBe(0.1);
    expect(priceAt(tariff, { month: 6, weekday: 3, minute: 5 * 60 })).toBe(0.1);
    expect(priceAt(tariff, { month: 1, weekday: 3, minute: 17 * 60 })).toBe(0.4);
    expect(priceAt(tariff, { month: 1, weekday: 0, minute: 17 * 60 })).toBe(0.2);
    expect(priceAt(tariff, { month: 2, weekday: 3, minute: 17 * 60 })).toBe(0.2);
  });
});
