import { describe, expect, it } from 'vitest';
import { carriedBy, LOAD_KINDS } from '@/lib/scenarios/circuit-loads';

const circuits = [{ id: 'a' }, { id: 'b' }];

describe('what the circuits of a room carry', () => {
  it('is everything on the first where the plan does not say', () => {
    expect(carriedBy({}, circuits)).toEqual([
      { id: 'a', carries: LOAD_KINDS },
      { id: 'b', carries: [] },
    ]);
  });

  it('is what the plan says, lamps by themselves included', () => {
    expect(carriedBy({ circuitLoads: { a: ['light'], b: ['heater', 'lamp-2'] } }, circuits)).toEqual([
      { id: 'a', carries: ['light'] },
      { id: 'b', carries: ['heater', 'lamp-2'] },
    ]);
  });

  it('counts on the first what hung on a circuit that is gone, so that no load vanishes', () => {
    expect(carriedBy({ circuitLoads: { gone: ['heater', 'light'], b: ['light'] } }, circuits)).toEqual([
      { id: 'a', carries: ['heater'] },
      { id: 'b', carries: ['light'] },
    ]);
  });

  it('takes ids such as constructor and __proto__ for ids', () => {
    const odd = [{ id: 'constructor' }, { id: '__proto__' }];
    expect(carriedBy({ circuitLoads: {} }, odd)).toEqual(odd.map(({ id }) => ({ id, carries: [] })));
  });

  it('is nothing at all in a room without circuits', () => {
    expect(carriedBy({ circuitLoads: { a: ['light'] } }, [])).toEqual([]);
  });
});
