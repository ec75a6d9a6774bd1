import { describe, expect, it } from 'vitest';
import { yearBetween } from '@/app/gardens/[gardenId]/rooms/new/_components/two-months';

describe('a year from two months', () => {
  it('touches exactly the coldest and the warmest that were typed', () => {
    const year = yearBetween({ coldC: 12.2, warmC: 18, south: false });
    if (year.kind !== 'monthly') throw new Error('expected twelve months');
    expect(Math.min(...year.values)).toBeCloseTo(12.2, 5);
    expect(Math.max(...year.values)).toBeCloseTo(18, 5);
    expect(year.values).toHaveLength(12);
  });

  it('is warm in the local summer on either half of the earth', () => {
    const north = yearBetween({ coldC: 5, warmC: 20, south: false });
    const south = yearBetween({ coldC: 5, warmC: 20, south: true });
    if (north.kind !== 'monthly' || south.kind !== 'monthly') throw new Error('expected twelve months');
    expect(north.values.indexOf(Math.max(...north.values))).toBe(7);
    expect(south.values.indexOf(Math.max(...south.values))).toBe(1);
  });

  it('is constant where both are alike', () => {
    expect(yearBetween({ coldC: 14, warmC: 14, south: false })).toEqual({ kind: 'constant', value: 14 });
  });
});
