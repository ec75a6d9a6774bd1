import {
  CUBIC_METRE_PER_HOUR_PER_CFM,
  KELVIN_PER_FAHRENHEIT_DEGREE,
  KILOGRAM_PER_POUND,
  LITRE_PER_US_GALLON,
  LITRE_PER_US_QUART,
  LUX_PER_FOOT_CANDLE,
  METRE_PER_FOOT,
  METRE_PER_INCH,
  SQUARE_METRE_PER_SQUARE_FOOT,
  U_VALUE_PER_BTU_H_FT2_F,
  WATT_PER_BTU_PER_HOUR,
} from '@/physics/units/conversions';

export type UnitSystem = 'metric' | 'us';

/** A unit that people write: stored value = written value × factor + offset. */
export interface WrittenUnit {
  /** As it is printed after the figure. */
  symbol: string;
  /** Other spellings, in lower case and without spaces. */
  names: readonly string[];
  factor: number;
  offset?: number;
  digits: number;
}

export interface QuantityRule {
  /** In an error: "Type a length such as 2.4 m, 244 cm, 8 ft or 96 in." */
  examples: string;
  noun: string;
  units: readonly WrittenUnit[];
  /** Places in `units` of what the person reads. */
  shown: Record<UnitSystem, number>;
}

const unit = (symbol: string, names: string[], factor: number, digits: number, offset = 0): WrittenUnit => ({
  symbol,
  names,
  factor,
  digits,
  offset,
});

const metre = (digits = 2) => unit('m', ['m', 'metre', 'metres', 'meter', 'meters'], 1, digits);
const centimetre = (digits = 0) => unit('cm', ['cm', 'centimetre', 'centimetres', 'centimeters'], 0.01, digits);
const millimetre = unit('mm', ['mm', 'millimetres', 'millimeters'], 0.001, 0);
const foot = (digits = 2) => unit('ft', ['ft', 'foot', 'feet', "'", '′'], METRE_PER_FOOT, digits);
const inch = (digits = 1) => unit('in', ['in', 'inch', 'inches', '"', '″'], METRE_PER_INCH, digits);

const one = (symbol: string, names: string[], digits: number, examples: string, noun: string): QuantityRule => ({
  examples,
  noun,
  units: [unit(symbol, [symbol.toLowerCase(), ...names], 1, digits)],
  shown: { metric: 0, us: 0 },
});

export const quantityRules = {
  length: {
    noun: 'a length',
    examples: '36 cm, 0.36 m or 14 in',
    units: [centimetre(), inch(), metre(), foot(), millimetre],
    shown: { metric: 0, us: 1 },
  },
  tallLength: {
    noun: 'a length',
    examples: '2.4 m, 244 cm, 8 ft or 96 in',
    units: [metre(), foot(), centimetre(), inch(), millimetre],
    shown: { metric: 0, us: 1 },
  },
  altitude: {
    noun: 'a height above the sea',
    examples: '63 m or 207 ft',
    units: [metre(0), foot(0)],
    shown: { metric: 0, us: 1 },
  },
  temperature: {
    noun: 'a temperature',
    examples: '15.6 °C or 60 °F',
    units: [
      unit('°C', ['c', '°c', 'degc', 'celsius'], 1, 1),
      unit(
        '°F',
        ['f', '°f', 'degf', 'fahrenheit'],
        KELVIN_PER_FAHRENHEIT_DEGREE,
        1,
        -32 * KELVIN_PER_FAHRENHEIT_DEGREE,
      ),
    ],
    shown: { metric: 0, us: 1 },
  },
  temperatureDifference: {
    noun: 'a difference of temperature',
    examples: '3 K or 5 °F',
    units: [
      unit('K', ['k', 'c', '°c', 'kelvin'], 1, 1),
      unit('°F', ['f', '°f', 'degf'], KELVIN_PER_FAHRENHEIT_DEGREE, 1),
    ],
    shown: { metric: 0, us: 1 },
  },
  airflow: {
    noun: 'an airflow',
    examples: '340 m³/h or 200 cfm',
    units: [
      unit('m³/h', ['m3/h', 'm³/h', 'm3h', 'cmh'], 1, 0),
      unit('cfm', ['cfm', 'ft3/min', 'ft³/min'], CUBIC_METRE_PER_HOUR_PER_CFM, 0),
      unit('L/s', ['l/s'], 3.6, 1),
    ],
    shown: { metric: 0, us: 1 },
  },
  volume: {
    noun: 'a volume',
    examples: '40 L or 10.5 gal',
    units: [
      unit('L', ['l', 'litre', 'litres', 'liter', 'liters'], 1, 1),
      unit('gal', ['gal', 'gallon', 'gallons', 'usgal'], LITRE_PER_US_GALLON, 1),
      unit('qt', ['qt', 'quart', 'quarts'], LITRE_PER_US_QUART, 1),
    ],
    shown: { metric: 0, us: 1 },
  },
  massFlow: {
    noun: 'a rate of water',
    examples: '0.4 kg/h or 0.9 lb/h',
    units: [unit('kg/h', ['kg/h', 'l/h'], 1, 2), unit('lb/h', ['lb/h', 'lbs/h'], KILOGRAM_PER_POUND, 2)],
    shown: { metric: 0, us: 1 },
  },
  area: {
    noun: 'an area',
    examples: '1.2 m² or 13 ft²',
    units: [unit('m²', ['m2', 'm²'], 1, 2), unit('ft²', ['ft2', 'ft²', 'sqft'], SQUARE_METRE_PER_SQUARE_FOOT, 1)],
    shown: { metric: 0, us: 1 },
  },
  uValue: {
    noun: 'a U-value',
    examples: '3.5 W/m²K or 0.62 BTU/h ft² °F',
    units: [
      unit('W/m²K', ['w/m2k', 'w/m²k', 'w/(m2k)', 'w/(m²k)'], 1, 2),
      unit('BTU/h ft² °F', ['btu/hft2f', 'btu/hft²°f', 'btu/(hft2f)', 'btu/hft2°f'], U_VALUE_PER_BTU_H_FT2_F, 3),
    ],
    shown: { metric: 0, us: 1 },
  },
  power: {
    noun: 'a power',
    examples: '300 W or 1.5 kW',
    units: [
      unit('W', ['w', 'watt', 'watts'], 1, 0),
      unit('kW', ['kw'], 1000, 2),
      unit('BTU/h', ['btu/h', 'btuh'], WATT_PER_BTU_PER_HOUR, 0),
    ],
    shown: { metric: 0, us: 0 },
  },
  illuminance: {
    noun: 'an illuminance',
    examples: '5000 lx or 465 fc',
    units: [unit('lx', ['lx', 'lux'], 1, 0), unit('fc', ['fc', 'ft-c'], LUX_PER_FOOT_CANDLE, 0)],
    shown: { metric: 0, us: 0 },
  },
  fraction: {
    noun: 'a share',
    examples: '62 %',
    units: [unit('%', ['%', 'percent'], 0.01, 0), unit('', ['of1'], 1, 2)],
    shown: { metric: 0, us: 0 },
  },
  energy: one('kWh', [], 0, '176 kWh', 'an energy'),
  relHumidity: one('%', ['percent', 'rh'], 0, '68 %', 'a relative humidity'),
  percent: one('%', ['percent'], 1, '7 %', 'a percentage'),
  ppf: one('µmol/s', ['umol/s', 'μmol/s'], 1, '480 µmol/s', 'a photon flux'),
  ppfd: one('µmol/m²/s', ['umol/m2/s', 'µmol/m2/s', 'μmol/m²/s', 'umol'], 0, '250 µmol/m²/s', 'a PPFD'),
  dli: one('mol', ['mol/m2/d', 'mol/m²/d', 'mol/d', 'mol/m²'], 1, '14.4 mol', 'a daily light integral'),
  hours: one('h', ['hr', 'hrs', 'hour', 'hours'], 1, '16 h', 'a number of hours'),
  minutes: one('min', ['m', 'mins', 'minute', 'minutes'], 0, '10 min', 'a number of minutes'),
  angle: one('°', ['deg', 'degree', 'degrees'], 0, '24 °', 'an angle'),
  current: one('A', ['amp', 'amps', 'ampere', 'amperes'], 1, '16 A', 'a current'),
  voltage: one('V', ['volt', 'volts'], 0, '230 V', 'a voltage'),
  airChanges: one('an hour', ['1/h', '/h', 'ach', 'h-1'], 1, '0.5 an hour', 'a number of air changes'),
  ratio: one('', [], 2, '0.85', 'a number'),
  count: one('', [], 0, '6', 'a whole number'),
  co2: one('g/kWh', [], 0, '210 g/kWh', 'an emission factor'),
  efficacy: one('µmol/J', ['umol/j', 'μmol/j'], 2, '2.6 µmol/J', 'a photon efficacy'),
  vpd: one('kPa', [], 2, '0.9 kPa', 'a vapour pressure deficit'),
  luminousFlux: one('lm', ['lumen', 'lumens'], 0, '800 lm', 'a luminous flux'),
  latitude: one('°', ['deg', 'degree', 'degrees'], 2, '52.41, 52° 24′ 36″ N or S 33.9', 'a latitude'),
  longitude: one('°', ['deg', 'degree', 'degrees'], 2, '9.73, 9° 43′ 48″ E or W 80.2', 'a longitude'),
} as const satisfies Record<string, QuantityRule>;

export type QuantityKind = keyof typeof quantityRules;

export function ruleOf(kind: QuantityKind): QuantityRule {
  return quantityRules[kind];
}

export function shownUnit(kind: QuantityKind, system: UnitSystem): WrittenUnit {
  const rule = ruleOf(kind);
  return rule.units[rule.shown[system]]!;
}
