import { describe, expect, it } from 'vitest';
import { sentenceInUnits } from '@/lib/format/sentence-units';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import { rackScenario } from '../../support/rack-scenario';

const plain = (text: string) => sentenceInUnits(text, 'us').replaceAll('\u00a0', ' ');

describe('a sentence of the physics in US units', () => {
  // By the exact factors of NIST SP 811: 2.54 cm to the inch, 1.8 °F to the kelvin, 28.316 846 592 L to the cubic foot, 3.785 411 784 L to the gallon.
  it.each([
    ['Keep 91 cm free.', 'Keep 36 in free.'],
    ['It slips to 14.5 °C.', 'It slips to 58 °F.'],
    ['reckoned no further than −60 °C and 100 °C.', 'reckoned no further than −76 °F and 212 °F.'],
    ['The wall is 1.5 K below the dew point.', 'The wall is 2.7 °F below the dew point.'],
    ['It takes 170 m³/h of air.', 'It takes 100 cfm of air.'],
    ['Up to 3.8 L of water a day', 'Up to 1.0 gal of water a day'],
    ['the usual 1 m (3 ft) is asked for', 'the usual 3 ft is asked for'],
    ['gets 620 µmol/m²/s on 16 A of 230 V at 80 %', 'gets 620 µmol/m²/s on 16 A of 230 V at 80 %'],
  ])('%s', (metric, us) => {
    expect(plain(metric)).toBe(us);
    expect(sentenceInUnits(metric, 'metric')).toBe(metric);
  });

  it('leaves nothing metric in any caution or warning of a cold, wet, hot tent', () => {
    const doc = rackScenario({ lamps: 4, tiers: 2 });
    doc.room.designTempC = -5;
    doc.room.hotDayTempC = 26;
    doc.climate.maxTempC = 27;
    doc.climate.exhaust = { maxAirflowM3H: 20, inputPowerW: 5 };
    doc.climate.heater = { ratedPowerW: 100, clearanceM: 0.9, placeM: [0.3, 0.3, 0] };
    const { cautions, warnings } = evaluateScenario(doc, { year: false });
    const metric = [...cautions.map((caution) => caution.text), ...warnings].join(' ');
    for (const unit of [' cm', ' °C', ' K ', ' m³/h']) expect(metric).toContain(unit);
    expect(plain(metric)).not.toMatch(/\d (cm|°C|K|m³\/h|L)\b/);
  });
});
