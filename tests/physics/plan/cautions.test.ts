import { describe, expect, it } from 'vitest';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import type { Caution } from '@/physics/plan/evaluation-document';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { rackScenario } from '../../support/rack-scenario';

/** A tent in which nothing is amiss but what must always be said. */
function calm(): ScenarioDocument {
  const doc = rackScenario({ lamps: 6, tiers: 3 });
  doc.room = { airTempC: { kind: 'constant', value: 16 }, relHumidityPct: { kind: 'constant', value: 45 } };
  doc.tent = { ...doc.tent, fabricUWM2K: 3 };
  doc.water = { reservoirL: 0, transpiration: { kind: 'fixed', lightKgH: 0.05, darkKgH: 0.02 } };
  doc.climate = {
    dayTempC: 22,
    nightTempC: 18,
    maxTempC: 30,
    heater: null,
    exhaust: { maxAirflowM3H: 250, inputPowerW: 30 },
  };
  doc.power.circuits = [{ id: 'c1', ratingA: 16, carries: ['light', 'heater', 'exhaust', 'pump'] }];
  return doc;
}

const cautionsOf = (change: (doc: ScenarioDocument) => void = () => {}): Caution[] => {
  const doc = calm();
  change(doc);
  return evaluateScenario(doc).cautions;
};
const codesOf = (change?: (doc: ScenarioDocument) => void) => cautionsOf(change).map((each) => each.code);
const one = (code: string, change: (doc: ScenarioDocument) => void): Caution => {
  const found = cautionsOf(change).filter((each) => each.code === code);
  expect(found.length, `${code} is said once`).toBe(1);
  return found[0]!;
};

const withHeater =
  (heater: Partial<NonNullable<ScenarioDocument['climate']['heater']>> = {}) =>
  (doc: ScenarioDocument) => {
    doc.climate.heater = { ratedPowerW: 400, ...heater };
  };
const target = { crop: 'Leaf', stage: 'any', dliTargetMolM2D: 14, photoperiodMinH: 12, photoperiodMaxH: 18 };

describe('every caution', () => {
  it('has a code, a place, a sentence that ends, and a source', () => {
    const all = cautionsOf((doc) => {
      withHeater({ ratedPowerW: 2500, placeM: [0.2, 0.2, 0.1] })(doc);
      doc.water = { pump: { inputPowerW: 25 } };
      doc.tiers.forEach((tier) => (tier.target = { ...target, dliTargetMolM2D: 2 }));
      doc.fixtures[0]!.ppfUmolS = 3000;
    });
    expect(all.length).toBeGreaterThan(8);
    for (const { code, where, text, source } of all) {
      expect(code).toMatch(/^[a-z]+\.[a-zA-Z]+$/);
      expect(where.length).toBeGreaterThan(2);
      expect(text).toMatch(/^[A-Zµt].*[.]$/u);
      expect(text).not.toMatch(/!|undefined|NaN|Infinity/);
      expect(source.length).toBeGreaterThan(3);
    }
    const order = all.map((each) => ['danger', 'warning', 'note'].indexOf(each.severity));
    expect(order).toEqual([...order].sort((a, b) => a - b));
  });

  it('is left out where it does not apply: no heater, no water, lamps off', () => {
    expect(
      codesOf((doc) => (doc.climate.nightTempC = doc.climate.dayTempC = 12)).filter((code) =>
        code.startsWith('heater.'),
      ),
    ).toEqual([]);
    expect(codesOf().filter((code) => code.startsWith('water.'))).toEqual([]);
    expect(codesOf((doc) => (doc.placements = [])).filter((code) => code.startsWith('light.'))).toEqual([]);
    expect(codesOf((doc) => (doc.tent.heightM = 2.2)).filter((code) => code.startsWith('circuit.'))).toEqual([]);
  });

  it('always says that this is a planning estimate', () => {
    expect(codesOf()).toContain('plan.estimate');
    expect(codesOf((doc) => Object.assign(doc, { placements: [], tiers: [] }))).toContain('plan.estimate');
  });
});

// NFPA, Electric Portable Space Heater Safety (2018): 3 ft on every side, a wall outlet of its own, off when unattended.
describe('a heater', () => {
  it('without a label asks for 1 m, and in a tent 1.2 m deep for another place to warm', () => {
    const { severity, text } = one('heater.clearance', withHeater({ placeM: [0.6, 0.6, 0.1] }));
    expect(severity).toBe('danger');
    expect(text).toMatch(/60 cm from the fabric/);
    expect(text).toMatch(/1 m \(3 ft\)/);
    expect(text).toMatch(/warm the room, or the air that is drawn in/);
  });

  it('keeps to its maker’s label where there is one, and names both', () => {
    const near = one('heater.clearance', withHeater({ placeM: [0.6, 0.6, 0.1], clearanceM: 0.75 }));
    expect(near.text).toMatch(/75 cm/);
    expect(near.text).toMatch(/1 m \(3 ft\)/);
    expect(near.severity).toBe('danger');
    expect(one('heater.clearance', withHeater({ placeM: [0.6, 0.6, 0.1], clearanceM: 0.5 })).severity).toBe('warning');
  });

  it('goes into a wall socket of its own, is watched at night, and has an alarm near', () => {
    const codes = codesOf(withHeater());
    for (const code of ['heater.socket', 'heater.unattended', 'heater.alarm']) expect(codes).toContain(code);
  });

  it('is kept from water where water is', () => {
    expect(codesOf(withHeater())).not.toContain('heater.damp');
    expect(codesOf((doc) => (withHeater()(doc), (doc.water = { pump: { inputPowerW: 20 } })))).toContain('heater.damp');
  });

  it('that is too small says what is missing and what the tent slips to', () => {
    const doc = calm();
    withHeater({ ratedPowerW: 50 })(doc);
    const { heat, year } = evaluateScenario(doc);
    const { text } = one('heater.short', withHeater({ ratedPowerW: 50 }));
    const needW = Math.max(heat.coldDark.heaterW, heat.coldDawn.heaterW, heat.coldLight.heaterW);
    expect(text).toContain(`${(needW - 50).toFixed(0)} W are missing`);
    expect(text).toContain(`slips to ${year.months[0]!.airTempC.min.toFixed(1)} °C`);
  });

  it('of more than twice the need is called too big, of the need not', () => {
    expect(codesOf(withHeater({ ratedPowerW: 3000 }))).toContain('heater.oversize');
    const { recommendedHeaterW } = evaluateScenario(calm()).heat;
    const fitting = codesOf(withHeater({ ratedPowerW: recommendedHeaterW }));
    expect(fitting).not.toContain('heater.oversize');
    expect(fitting).not.toContain('heater.short');
  });
});

describe('circuits', () => {
  // 1,500 W at 120 V are 12.5 A: over 80 % of 15 A, within 80 % of 20 A (NEC 210.20(A)).
  const heaterOn = (supplyV: number, ratingA: number, ratedPowerW: number) => (doc: ScenarioDocument) => {
    withHeater({ ratedPowerW })(doc);
    doc.power = { ...doc.power, supplyV, circuits: [{ id: 'c1', ratingA, carries: ['heater'] }] };
  };
  it('warn of 1,500 W on 15 A at 120 V and not on 20 A', () => {
    expect(one('circuit.overContinuous', heaterOn(120, 15, 1500)).text).toMatch(
      /12\.5 A; 80 % of the 15 A breaker is 12\.0 A/,
    );
    expect(codesOf(heaterOn(120, 20, 1500)).filter((code) => code.startsWith('circuit.over'))).toEqual([]);
  });
  it('say on 230 V that the 80 % is planning advice', () => {
    expect(one('circuit.overContinuous', heaterOn(230, 16, 3200)).text).toMatch(
      /planning advice, not a rule; local code decides/,
    );
    expect(one('circuit.overRating', heaterOn(230, 10, 3200)).severity).toBe('danger');
  });
  it('name no circuit for a heater that would pass the breaker’s rating with what is on it for a while', () => {
    const doc = calm();
    doc.schedules[0]!.hours = 2.5;
    doc.power = { ...doc.power, supplyV: 120, circuits: [{ id: 'c1', ratingA: 15, carries: ['light', 'heater'] }] };
    doc.fixtures[0]!.inputPowerW = 270;
    // Lamps of 1,620 W draw 14.2 A; at 2.5 h they do not count as long, yet with the heater the 15 A are passed.
    const { heat, cautions } = evaluateScenario(doc);
    expect(heat.recommendedHeaterW / 120).toBeGreaterThan(15 - 1620 / (0.95 * 120));
    expect(heat.recommendedHeaterCircuit).toBeNull();
    expect(cautions.map((each) => each.code)).toContain('circuit.noneForHeater');
  });
});

describe('water and air', () => {
  it('asks for a residual-current device of 30 mA and a drip loop beside water', () => {
    const wet = (doc: ScenarioDocument) => (doc.water = { pump: { inputPowerW: 20 } });
    expect(one('water.residualCurrent', wet).text).toMatch(/30 mA/);
    expect(codesOf(wet)).toContain('water.dripLoop');
  });
  it('says when the wall sweats, when humidity runs over, when the hot day is too hot', () => {
    expect(codesOf()).not.toContain('air.condensation');
    const damp = codesOf((doc) => {
      doc.room.airTempC = { kind: 'constant', value: 5 };
      doc.climate.exhaust = null;
      doc.water = { transpiration: { kind: 'fixed', lightKgH: 0.4, darkKgH: 0.3 } };
    });
    for (const code of ['air.condensation', 'air.humidity']) expect(damp).toContain(code);
    expect(codesOf()).not.toContain('air.overheat');
    const hot = (doc: ScenarioDocument) => (doc.room.hotDayTempC = 31);
    expect(one('air.overheat', hot).text).toMatch(/no fan can hold it/);
  });
});

describe('light', () => {
  const aimed = (change: Partial<typeof target>) => (doc: ScenarioDocument) =>
    doc.tiers.forEach((tier) => (tier.target = { ...target, ...change }));
  it('over 600 µmol/m²/s on greens is bright, on a crop that wants 30 mol a day it is not', () => {
    const strong = (dliTargetMolM2D: number) => (doc: ScenarioDocument) => {
      aimed({ dliTargetMolM2D })(doc);
      doc.fixtures[0]!.ppfUmolS = 2000;
    };
    expect(codesOf(strong(14))).toContain('light.bright');
    expect(codesOf(strong(30))).not.toContain('light.bright');
  });
  it('above the band and far below it are told apart', () => {
    expect(codesOf(aimed({ dliTargetMolM2D: 1 }))).toContain('light.above');
    expect(codesOf(aimed({ dliTargetMolM2D: 40 }))).toContain('light.hopeless');
  });
  it('longer or shorter than the crop’s day is said', () => {
    expect(codesOf(aimed({ photoperiodMaxH: 12 }))).toContain('light.longDay');
    expect(codesOf(aimed({ photoperiodMinH: 18 }))).toContain('light.shortDay');
    const fitting = codesOf(aimed({}));
    for (const code of ['light.longDay', 'light.shortDay']) expect(fitting).not.toContain(code);
  });
  it('straying into dark hours matters where the crop’s day has a longest length', () => {
    const stray = (photoperiodMaxH: number | undefined) => (doc: ScenarioDocument) => {
      doc.tiers.forEach((tier) => (tier.target = { ...target, photoperiodMaxH } as typeof target));
      doc.schedules.push({ id: 'night', onAt: '22:00', hours: 8 });
      doc.placements.filter((each) => each.tier === 't2').forEach((each) => (each.schedule = 'night'));
    };
    expect(codesOf(stray(18))).toContain('light.stray');
    expect(codesOf(stray(undefined))).not.toContain('light.stray');
  });
});
