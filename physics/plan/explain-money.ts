import { sources } from '../sources';
import type { Device } from './evaluation-document';
import { standingAt, type ExplainContext } from './explain';
import type { Explanation, ExplanationTerm } from './explanation';
import { rangeOf } from './uncertainty';

const computed = { standing: 'computed', source: 'Computed' } as const;
const WORDS: Record<Device, string> = {
  light: 'lamps',
  heater: 'heater',
  exhaust: 'exhaust fan',
  circulation: 'circulation fan',
  pump: 'pump',
};
const DEVICES = Object.keys(WORDS) as Device[];

const deviceTerms = (of: Record<Device, number>, unit: string): ExplanationTerm[] =>
  DEVICES.filter((device) => of[device] > 0).map((device) => ({
    operator: '+',
    value: of[device],
    unit,
    label: WORDS[device],
    ...computed,
  }));

/** Energy and cost of the year or of a month. */
export function explainYear(context: ExplainContext, path: string, parts: readonly string[]): Explanation | null {
  const { document, evaluation, scenario } = context;
  const { currency, kind } = scenario.power.tariff;
  const monthly = parts[1] === 'months';
  const figure = parts.at(-1);
  const index = monthly ? Number(parts[2]) - 1 : 0;
  const of = monthly ? evaluation.year.months[index] : evaluation.year;
  if (!of || (figure !== 'energy' && figure !== 'cost')) return null;
  const read = (each: typeof evaluation) => {
    const part = monthly ? each.year.months[index]! : each.year;
    return figure === 'cost' ? part.cost : part.energyKwh.total;
  };
  const price = standingAt(evaluation, 'power.tariff');
  const period = monthly ? `month ${index + 1}` : 'the year';
  return {
    path,
    title: figure === 'cost' ? `What ${period} costs` : `What ${period} takes from the socket`,
    formula:
      figure === 'energy'
        ? 'energy = Σ watts × hours, a steady balance of each hour'
        : kind === 'flat'
          ? 'cost = energy × price, with tax and, for a tent alone, the fixed charge'
          : kind === 'timeOfUse'
            ? 'cost = Σ energy × the price of its hour, with tax'
            : 'cost = bill of household and tent − bill of the household, with tax',
    terms: figure === 'cost' ? deviceTerms(of.costByDevice, currency) : deviceTerms(of.energyKwh, 'kWh'),
    result: figure === 'cost' ? { value: of.cost, unit: currency } : { value: of.energyKwh.total, unit: 'kWh' },
    range: rangeOf(document, evaluation, read, 'year'),
    sources: [
      ...(figure === 'cost'
        ? [price.standing === 'given' ? 'Price: as given' : `Price: ${price.source.replace(/^Default: /, '')}`]
        : []),
      sources.ISO6946.citation,
      sources.Graamans2017.citation,
      evaluation.warnings.find((text) => text.startsWith('The year')) ?? 'Computed',
    ],
    makesItSurer: 'Read a meter at the tent’s plug once a month.',
  };
}

export function explainCircuit({ evaluation, scenario }: ExplainContext, path: string, id: string): Explanation | null {
  const circuit = evaluation.circuits.find((each) => each.id === id);
  const given = scenario.power.circuits.find((each) => each.id === id);
  if (!circuit || !given) return null;
  const otherA = given.otherLoadsW / scenario.power.supplyV;
  const index = scenario.power.circuits.indexOf(given);
  return {
    path,
    title: 'Current of what runs three hours or more',
    formula: 'I = Σ power ÷ (voltage × power factor)',
    terms: [
      { operator: '', value: circuit.continuousA - otherA, unit: 'A', label: 'this tent', ...computed },
      {
        operator: '+',
        value: otherA,
        unit: 'A',
        label: 'what else hangs on the circuit',
        ...standingAt(evaluation, `power.circuits[${index}].otherLoadsW`),
      },
    ],
    result: { value: circuit.continuousA, unit: 'A' },
    range: null,
    sources: [sources.NEC210.citation],
    makesItSurer: 'Read the rating off the breaker and list what else it feeds. A licensed electrician decides.',
  };
}

/** How many minor units make one of a currency: 100 cents, 1 yen. */
const minorUnits = (currency: string): number =>
  10 ** (new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions().maximumFractionDigits ?? 2);

export function explainUpFront({ evaluation, scenario }: ExplainContext, path: string): Explanation {
  const { currency } = scenario.power.tariff;
  const minor = minorUnits(currency);
  const terms = scenario.fixtures.flatMap((fixture): ExplanationTerm[] => {
    const buy = Math.max(
      0,
      scenario.placements.filter((placement) => placement.fixture === fixture.id).length - fixture.owned,
    );
    if (buy === 0) return [];
    return [
      {
        operator: '+',
        value: (buy * fixture.priceMinor) / minor,
        unit: currency,
        label: `${buy} × ${fixture.name}`,
        ...(fixture.priceMinor > 0
          ? { standing: 'given', source: 'Given with the lamp' }
          : { standing: 'judgement', source: 'No price is given' }),
      } as ExplanationTerm,
    ];
  });
  const device = (label: string, item: { owned: boolean; priceMinor: number } | null) => {
    if (item && !item.owned)
      terms.push({
        operator: '+',
        value: item.priceMinor / minor,
        unit: currency,
        label,
        standing: 'given',
        source: 'Given in this scenario',
      });
  };
  device('heater', scenario.climate.heater);
  device('exhaust fan', scenario.climate.exhaust);
  return {
    path,
    title: 'Money up front',
    formula: 'what is placed and not had already × its price',
    terms,
    result: { value: evaluation.upFront.costMinor / minor, unit: currency },
    range: null,
    sources: ['Prices as given'],
    makesItSurer: 'Type the price of each lamp.',
  };
}

export function explainFixture({ evaluation, scenario }: ExplainContext, path: string, id: string): Explanation | null {
  const index = scenario.fixtures.findIndex((each) => each.id === id);
  const fixture = scenario.fixtures[index];
  if (!fixture) return null;
  const from = standingAt(evaluation, `fixtures[${index}].ppfUmolS`);
  return {
    path,
    title: `${fixture.name}: photons`,
    formula: 'PPF as its box says, or lumens × µmol for each lumen of its colour',
    terms: [
      {
        operator: '',
        value: fixture.ppfUmolS,
        unit: 'µmol/s',
        label: 'photon flux',
        standing: from.standing,
        source: from.standing === 'given' ? 'Given with the lamp' : from.source,
      },
    ],
    result: { value: fixture.ppfUmolS, unit: 'µmol/s' },
    range: null,
    sources: [sources.CIE15.citation],
    makesItSurer: 'One PPFD reading straight under the lamp.',
  };
}
