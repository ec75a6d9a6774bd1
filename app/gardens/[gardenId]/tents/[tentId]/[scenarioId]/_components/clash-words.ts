/** A conflict's path and its two values in the words of the page. */
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { formatQuantity, type QuantityKind, type UnitSystem } from '@/lib/format/quantity';
import { aboveLeavesM, servedTier, swingDeg } from '@/lib/scenarios/lamp-pose';
import type { Conflict } from '@/lib/scenarios/merge-plans';
import { tierName } from '@/app/_components/section/tier-names';

export interface ClashWords {
  thing: string;
  figure: string;
  mine: string;
  theirs: string;
}

const FIGURES: Record<string, { words: string; kind: QuantityKind }> = {
  dimFrac: { words: 'Output', kind: 'fraction' },
  topHeightM: { words: 'Shelf above the floor', kind: 'length' },
  canopyHeightM: { words: 'Leaves above the shelf', kind: 'length' },
  leafAreaIndex: { words: 'Leaf area', kind: 'ratio' },
  hours: { words: 'Hours on', kind: 'hours' },
  ratedPowerW: { words: 'Rated power', kind: 'power' },
  clearanceM: { words: 'Clearance', kind: 'length' },
  dayTempC: { words: 'By day', kind: 'temperature' },
  nightTempC: { words: 'By night', kind: 'temperature' },
  maxTempC: { words: 'At most', kind: 'temperature' },
  maxRelHumidityPct: { words: 'Humidity at most', kind: 'relHumidity' },
  maxAirflowM3H: { words: 'Exhaust at its most', kind: 'airflow' },
  minAirflowM3H: { words: 'Exhaust at its least', kind: 'airflow' },
  inputPowerW: { words: 'It takes', kind: 'power' },
  reservoirL: { words: 'Reservoir', kind: 'volume' },
  minutes: { words: 'A flood lasts', kind: 'minutes' },
  everyMinutes: { words: 'and comes every', kind: 'minutes' },
};

const THINGS: Record<string, string> = { climate: 'Climate', water: 'Water', schedules: 'Timer', boxes: 'Box' };

function thingName([list, id]: string[], doc: ScenarioDocument): string {
  if (list === 'placements') {
    const lamp = doc.placements.find((each) => each.id === id);
    return doc.fixtures.find((fixture) => fixture.id === lamp?.fixture)?.name ?? 'Lamp';
  }
  if (list === 'tiers') return tierName(doc.tiers, id ?? '');
  return THINGS[list ?? ''] ?? 'The plan';
}

function lampFigure(key: string, value: unknown, lampId: string, doc: ScenarioDocument, units: UnitSystem) {
  const lamp = doc.placements.find((each) => each.id === lampId);
  if (!lamp || !Array.isArray(value)) return null;
  const triple = value as unknown as (typeof lamp)['positionM'];
  const say = (metres: number) => formatQuantity(metres, 'length', units).text;
  if (key === 'positionM') {
    const there = { ...lamp, positionM: triple };
    const tier = servedTier(there, doc.tiers);
    return `${say(aboveLeavesM(there, tier))} above the ${tier ? 'leaves' : 'floor'}, ${say(triple[0])} from the left`;
  }
  if (key === 'aim') return `swung ${Math.round(swingDeg({ aim: triple }, 'front'))}°`;
  return null;
}

export function clashWords(conflict: Conflict, doc: ScenarioDocument, units: UnitSystem): ClashWords {
  const parts = conflict.path.split('.');
  const key = parts.at(-1)!;
  const known = FIGURES[key];
  const say = (value: unknown): string => {
    if (value === undefined) return parts.length <= 2 ? 'taken out' : 'left to its default';
    if (value === null) return 'none';
    if (parts[0] === 'placements') {
      const words = lampFigure(key, value, parts[1] ?? '', doc, units);
      if (words) return words;
    }
    if (known && typeof value === 'number') return formatQuantity(value, known.kind, units).text;
    if (typeof value === 'object') {
      const crop = value as { crop?: string; stage?: string };
      return crop.crop ? `${crop.crop}, ${crop.stage}` : 'changed';
    }
    return String(value);
  };
  const figure =
    known?.words ??
    {
      positionM: 'Place',
      aim: 'Tilt',
      axis: 'Direction',
      targetRef: 'Crop',
      onAt: 'On at',
      name: 'Name',
      sites: 'Sites',
    }[key] ??
    'All of it';
  return { thing: thingName(parts, doc), figure, mine: say(conflict.mine), theirs: say(conflict.theirs) };
}
