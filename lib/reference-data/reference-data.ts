import 'server-only';

import { readFileSync } from 'node:fs';
import path from 'node:path';
import type { Standing } from '@/lib/evaluation/evaluate-scenario';
import type { CropFigure, CropStage } from '../crops/crop.schema';
import type { LampColour } from '../fixtures/fixture-photons';
import { parseCsv } from './csv';

const read = (file: string) => parseCsv(readFileSync(path.join(process.cwd(), 'reference-data', file), 'utf8'));

const STANDINGS: Record<string, Standing> = {
  'read (excerpt or abstract)': 'read',
  'read on a secondary page quoting it': 'secondary',
  computed: 'computed',
  'judgement anchored on the named source': 'judgement',
  'recalled, unconfirmed': 'recalled',
};

function standingOf(knownHow: string, where: string): Standing {
  const standing = STANDINGS[knownHow];
  if (!standing) throw new Error(`reference-data: ${where} is known "${knownHow}", which is no standing`);
  return standing;
}

function numberOf(text: string, where: string): number | null {
  if (text.trim() === '') return null;
  const value = Number(text);
  if (!Number.isFinite(value)) throw new Error(`reference-data: "${text}" is not a number, ${where}`);
  return value;
}

function loadCrops(): CropStage[] {
  const citations = new Map(read('crop_sources.csv').map((row) => [row['key']!, row['citation']!]));
  const stages = new Map<string, CropStage>();
  const responses = new Map<string, string>();
  for (const row of read('crops.csv')) {
    const [crop, stage, quantity] = [row['crop']!, row['stage']!, row['quantity']!];
    const where = `${crop}, ${stage}, ${quantity}`;
    if (quantity === 'photoperiod_class') {
      if (!responses.has(crop)) responses.set(crop, row['target']!);
      continue;
    }
    const key = `${crop}\n${stage}`;
    const entry = stages.get(key) ?? { crop, botanicalName: row['botanical_name']!, stage, response: null, figures: {} };
    stages.set(key, entry);
    const figure: CropFigure = {
      low: numberOf(row['low']!, where),
      target: numberOf(row['target']!, where),
      high: numberOf(row['high']!, where),
      unit: row['unit']!.replace('degC', '°C').replace('umol', 'µmol').replace('/m2', '/m²'),
      sourceKey: row['source_key']!,
      source: citations.get(row['source_key']!) ?? row['source_key']!,
      standing: standingOf(row['known_how']!, where),
    };
    (entry.figures[quantity] ??= []).push(figure);
  }
  return [...stages.values()].map((stage) => ({ ...stage, response: responses.get(stage.crop) ?? null }));
}

function loadColours(): LampColour[] {
  return read('photon_conversions.csv').map((row) => {
    const blue = Number(row['B']);
    const green = Number(row['G']);
    return { name: row['name']!, umolPerKlm: Number(row['umol_per_klm']), blueFrac: blue, greenFrac: green, redFrac: Number(row['R']) };
  });
}

export interface ReferencePrice {
  area: string;
  place: string;
  period: string;
  pricePerKwh: number;
  currency: string;
  source: string;
  /** How it was read, in the file's own words. */
  knownHow: string;
  standing: Standing;
}

function loadPrices(): ReferencePrice[] {
  return read('electricity_prices.csv').flatMap((row): ReferencePrice[] => {
    const american = row['unit']!.includes('cents');
    const price = Number(row['price']);
    if (!Number.isFinite(price) || row['price'] === '') return [];
    return [
      {
        area: row['area']!,
        place: row['place']!,
        period: row['period']!,
        pricePerKwh: american ? price / 100 : price,
        currency: american ? 'USD' : 'EUR',
        source: row['source']!,
        knownHow: row['how_known']!,
        // Read in the work itself, unless its row says that it was quoted elsewhere.
        standing: /secondary|repeating/.test(row['how_known']!) ? 'secondary' : 'read',
      },
    ];
  });
}

interface ReferenceData {
  crops: CropStage[];
  colours: LampColour[];
  prices: ReferencePrice[];
}

let loaded: ReferenceData | undefined;

/** The reference files, read and checked once. */
export function referenceData(): ReferenceData {
  loaded ??= { crops: loadCrops(), colours: loadColours(), prices: loadPrices() };
  return loaded;
}
