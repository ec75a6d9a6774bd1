import type { Standing } from './evaluation-document';
import type { SourceKey } from '../sources';

export interface Default {
  value: number;
  unit: string;
  source: SourceKey;
  standing: Standing;
  /** What it plausibly lies between. */
  range?: readonly [number, number];
  /** One sentence for whoever wonders. */
  why: string;
}

const of = (
  value: number,
  unit: string,
  source: SourceKey,
  standing: Standing,
  why: string,
  range?: readonly [number, number],
): Default => ({
  value,
  unit,
  source,
  standing,
  why,
  ...(range && { range }),
});

/** What is taken where a scenario is silent, by the last parts of its path. Never shown as known. */
export const defaults = {
  'calendar.year': of(2026, '', 'JUDGEMENT', 'judgement', 'The year decides weekdays and leap days only.'),
  'room.relHumidityPct': of(60, '%', 'JUDGEMENT', 'judgement', 'Cellars run from 45 to 80 %.', [45, 80]),
  'room.slabTempC': of(
    -1.5,
    'K to the air',
    'JUDGEMENT',
    'judgement',
    'A slab on the ground lies 0 to 4 K below the air.',
    [-4, 0],
  ),
  'tent.liningReflectanceFrac': of(
    0.85,
    'of 1',
    'SURFACES',
    'read',
    'Clean metallised or white lining; creased or dusty it falls to 0.6.',
    [0.6, 0.92],
  ),
  'tent.floorReflectanceFrac': of(
    0.3,
    'of 1',
    'JUDGEMENT',
    'judgement',
    'Trays, pots and a dark floor sheet.',
    [0.1, 0.6],
  ),
  'tent.floorUWM2K': of(
    1.5,
    'W/m²K',
    'JUDGEMENT',
    'judgement',
    'Bare tent floor 2 to 3, trays or foam 0.7 to 0.9.',
    [0.5, 3],
  ),
  'tent.leakageAch': of(
    0.5,
    'an hour',
    'JUDGEMENT',
    'judgement',
    'Zipped, fan off; nobody has published a measurement.',
    [0.1, 2],
  ),
  'tent.liningEmittanceFrac': of(
    0.5,
    'of 1',
    'SURFACES',
    'read',
    'Metal under a film of some 25 µm; bare metal 0.05, thick film 0.76.',
    [0.05, 0.9],
  ),
  'tier.thicknessM': of(0.02, 'm', 'JUDGEMENT', 'judgement', 'A tray on its shelf.', [0.005, 0.08]),
  'tier.openFrac': of(0, 'of 1', 'JUDGEMENT', 'judgement', 'A tray lets no light through.', [0, 0.5]),
  'tier.topReflectanceFrac': of(
    0.12,
    'of 1',
    'JUDGEMENT',
    'judgement',
    'Mostly leaves, which throw back 0.05 to 0.1 of photosynthetic light.',
    [0.05, 0.3],
  ),
  'tier.bottomReflectanceFrac': of(
    0.5,
    'of 1',
    'JUDGEMENT',
    'judgement',
    'A light plastic or painted underside.',
    [0.1, 0.85],
  ),
  'tier.edgeReflectanceFrac': of(0.5, 'of 1', 'JUDGEMENT', 'judgement', 'As the underside.', [0.1, 0.85]),
  'tier.canopyHeightM': of(
    0.1,
    'm',
    'JUDGEMENT',
    'judgement',
    'Young leaves stand about 10 cm over the tray.',
    [0.02, 0.6],
  ),
  'tier.leafAreaIndex': of(
    1.5,
    'm²/m²',
    'RECALLED',
    'recalled',
    'Seedlings 0.3, half grown 1.5, a closed canopy 3.',
    [0.3, 4],
  ),
  'tier.canopyCoverFrac': of(
    0.9,
    'of 1',
    'Graamans2017',
    'secondary',
    'A grown lettuce canopy covers 0.9 to 0.95 of its tray.',
    [0.2, 0.95],
  ),
  'target.dliLowMolM2D': of(
    0.8,
    'of the target',
    'JUDGEMENT',
    'judgement',
    'No lower edge is given: four fifths of the target.',
  ),
  'target.dliHighMolM2D': of(
    1.2,
    'of the target',
    'JUDGEMENT',
    'judgement',
    'No upper edge is given: six fifths of the target.',
  ),
  'fixture.housingThicknessM': of(0.04, 'm', 'JUDGEMENT', 'judgement', 'A bar or panel with its heat sink.', [0, 0.15]),
  'fixture.housingReflectanceFrac': of(
    0.5,
    'of 1',
    'JUDGEMENT',
    'judgement',
    'Grey aluminium or white paint.',
    [0.1, 0.85],
  ),
  'fixture.driverOutsideFrac': of(
    0,
    'of 1',
    'JUDGEMENT',
    'judgement',
    'The driver hangs in the tent unless you say otherwise; outside it takes 0.04 to 0.12 of the power with it.',
    [0, 0.12],
  ),
  'fixture.powerFactor': of(
    0.95,
    'of 1',
    'RECALLED',
    'recalled',
    'LED drivers of some size; household bulbs run near 0.7.',
    [0.5, 1],
  ),
  'fixture.priceMinor': of(0, 'minor units', 'JUDGEMENT', 'judgement', 'No price is given, so none is counted.'),
  'fixture.owned': of(0, 'lamps', 'JUDGEMENT', 'judgement', 'None is counted as had already.'),
  'fixture.lifeH': of(50000, 'h', 'RECALLED', 'recalled', 'What makers of LED lamps usually state.', [20000, 60000]),
  'placement.dimFrac': of(1, 'of 1', 'JUDGEMENT', 'judgement', 'Full output.'),
  'climate.maxRelHumidityPct': of(
    75,
    '%',
    'JUDGEMENT',
    'judgement',
    'Above 80 % for hours, mould and leaf disease gain ground.',
    [65, 85],
  ),
  'climate.exhaust.minAirflowM3H': of(0, 'm³/h', 'JUDGEMENT', 'judgement', 'The fan may stand still.'),
  'water.reservoirL': of(40, 'L', 'JUDGEMENT', 'judgement', 'A common household tub.', [10, 200]),
  'water.coveredFrac': of(1, 'of 1', 'JUDGEMENT', 'judgement', 'A lid on the reservoir.', [0, 1]),
  'water.flood.minutes': of(10, 'min', 'JUDGEMENT', 'judgement', 'Benches stay flooded 5 to 20 minutes.', [5, 20]),
  'water.flood.everyMinutes': of(
    240,
    'min',
    'JUDGEMENT',
    'judgement',
    'Plugs want two to four floods a day, pebbles four to eight.',
    [120, 720],
  ),
  'power.co2GKwh': of(210, 'g/kWh', 'EEA', 'computed', 'European mean of 2023.', [30, 750]),
  'power.co2GKwh.USD': of(348, 'g/kWh', 'EGRID2023', 'secondary', 'Mean of the United States in 2023.', [150, 750]),
  'circuit.otherLoadsW': of(0, 'W', 'JUDGEMENT', 'judgement', 'Nothing else is counted on this circuit.'),
  'tariff.fixedPerMonth': of(0, 'a month', 'JUDGEMENT', 'judgement', 'No fixed charge is given.'),
  'tariff.taxPct': of(0, '%', 'JUDGEMENT', 'judgement', 'The price is taken with tax.'),
  'tariff.householdBaseKwhPerMonth': of(0, 'kWh', 'JUDGEMENT', 'judgement', 'The tent is reckoned alone.'),
} as const satisfies Record<string, Default>;

export type DefaultKey = keyof typeof defaults;
