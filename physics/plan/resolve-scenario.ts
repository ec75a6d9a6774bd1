import { fabricFromFilms } from '../heat/envelope';
import type { FaceReflectance } from '../light/light-documents';
import { sources } from '../sources';
import { defaults, type DefaultKey } from './defaults';
import type { Assumption } from './evaluation-document';
import type { ResolvedFixture, ResolvedScenario, ResolvedTarget, ResolvedTier } from './resolved-scenario';
import type { FixtureType, ScenarioDocument, Target, Tier } from './scenario-document';

/** Collects what was assumed while a scenario is filled in. */
class Filling {
  readonly assumptions: Assumption[] = [];

  /** The given value, or the default, written down under its path. */
  take(given: number | undefined, key: DefaultKey, path: string): number {
    if (given !== undefined) return given;
    const { value, unit, source, standing } = defaults[key];
    this.note(path, value, unit, source, standing);
    return value;
  }

  /** Where nothing is said of the plants' water, the model reckons it. */
  model(): { kind: 'model' } {
    this.note('water.transpiration', 'model', '', 'Graamans2017', 'secondary');
    return { kind: 'model' };
  }

  note(
    path: string,
    value: Assumption['value'],
    unit: string,
    source: keyof typeof sources,
    standing: Assumption['standing'],
  ): void {
    this.assumptions.push({ path, value, unit, source: sources[source].citation, standing });
  }
}

function fillTent({ tent, climate }: ScenarioDocument, fill: Filling): ResolvedScenario['tent'] {
  const lining = tent.liningReflectanceFrac;
  let reflectance: FaceReflectance;
  if (typeof lining === 'object')
    reflectance = tent.floorReflectanceFrac === undefined ? lining : { ...lining, floor: tent.floorReflectanceFrac };
  else {
    const wall = fill.take(lining, 'tent.liningReflectanceFrac', 'tent.liningReflectanceFrac');
    const floor = fill.take(tent.floorReflectanceFrac, 'tent.floorReflectanceFrac', 'tent.floorReflectanceFrac');
    reflectance = { xMin: wall, xMax: wall, yMin: wall, yMax: wall, ceiling: wall, floor };
  }
  const liningEmittanceFrac = fill.take(
    tent.liningEmittanceFrac,
    'tent.liningEmittanceFrac',
    'tent.liningEmittanceFrac',
  );
  const films = fabricFromFilms({ liningEmittanceFrac, stirred: (climate.circulation?.inputPowerW ?? 0) > 0 });
  if (tent.fabricUWM2K === undefined) fill.note('tent.fabricUWM2K', films.wallUWM2K, 'W/m²K', 'ISO6946', 'computed');
  return {
    widthM: tent.widthM,
    depthM: tent.depthM,
    heightM: tent.heightM,
    reflectance,
    wallUWM2K: tent.fabricUWM2K ?? films.wallUWM2K,
    roofUWM2K: tent.fabricUWM2K ?? films.roofUWM2K,
    floorUWM2K: fill.take(tent.floorUWM2K, 'tent.floorUWM2K', 'tent.floorUWM2K'),
    leakageAch: fill.take(tent.leakageAch, 'tent.leakageAch', 'tent.leakageAch'),
    liningEmittanceFrac,
    innerFilmWM2K: films.innerFilmWM2K,
  };
}

function fillTarget(target: Target, path: string, fill: Filling): ResolvedTarget {
  const edge = (given: number | undefined, key: 'target.dliLowMolM2D' | 'target.dliHighMolM2D', name: string) => {
    if (given !== undefined) return given;
    const { value, standing, source } = defaults[key];
    fill.note(`${path}.${name}`, value * target.dliTargetMolM2D, 'mol/m²/d', source, standing);
    return value * target.dliTargetMolM2D;
  };
  return {
    ...target,
    dliLowMolM2D: edge(target.dliLowMolM2D, 'target.dliLowMolM2D', 'dliLowMolM2D'),
    dliHighMolM2D: edge(target.dliHighMolM2D, 'target.dliHighMolM2D', 'dliHighMolM2D'),
  };
}

function fillTier(tier: Tier, index: number, tentHeightM: number, fill: Filling): ResolvedTier {
  const path = `tiers[${index}]`;
  const take = <K extends keyof Tier>(
    name: K &
      (
        | 'openFrac'
        | 'topReflectanceFrac'
        | 'bottomReflectanceFrac'
        | 'edgeReflectanceFrac'
        | 'leafAreaIndex'
        | 'canopyCoverFrac'
      ),
  ) => fill.take(tier[name], `tier.${name}`, `${path}.${name}`);
  // A default tray is no thicker than the room beneath it, default leaves no higher than the tent.
  const atMost = (name: 'thicknessM' | 'canopyHeightM', mostM: number): number => {
    const given = tier[name];
    if (given !== undefined) return given;
    const { value, unit, source, standing } = defaults[`tier.${name}`];
    fill.note(`${path}.${name}`, Math.min(value, mostM), unit, source, standing);
    return Math.min(value, mostM);
  };
  return {
    ...tier,
    name: tier.name ?? tier.id,
    thicknessM: atMost('thicknessM', tier.topHeightM),
    openFrac: take('openFrac'),
    topReflectanceFrac: take('topReflectanceFrac'),
    bottomReflectanceFrac: take('bottomReflectanceFrac'),
    edgeReflectanceFrac: take('edgeReflectanceFrac'),
    canopyHeightM: atMost('canopyHeightM', Math.max(0, tentHeightM - tier.topHeightM)),
    leafAreaIndex: take('leafAreaIndex'),
    canopyCoverFrac: take('canopyCoverFrac'),
    target: tier.target ? fillTarget(tier.target, `${path}.target`, fill) : null,
  };
}

function fillFixture(fixture: FixtureType, index: number, fill: Filling): ResolvedFixture {
  const path = `fixtures[${index}]`;
  const take = (name: 'driverOutsideFrac' | 'powerFactor' | 'priceMinor' | 'owned' | 'lifeH') =>
    fill.take(fixture[name], `fixture.${name}`, `${path}.${name}`);
  const body = fixture.shape === 'rect';
  return {
    ...fixture,
    name: fixture.name ?? fixture.id,
    housingThicknessM: body
      ? fill.take(fixture.housingThicknessM, 'fixture.housingThicknessM', `${path}.housingThicknessM`)
      : 0,
    housingReflectanceFrac: body
      ? fill.take(fixture.housingReflectanceFrac, 'fixture.housingReflectanceFrac', `${path}.housingReflectanceFrac`)
      : 0,
    driverOutsideFrac: take('driverOutsideFrac'),
    powerFactor: take('powerFactor'),
    priceMinor: take('priceMinor'),
    owned: take('owned'),
    lifeH: take('lifeH'),
  };
}

function fillClimate({ climate }: ScenarioDocument, fill: Filling): ResolvedScenario['climate'] {
  const { heater, exhaust } = climate;
  return {
    dayTempC: climate.dayTempC,
    nightTempC: climate.nightTempC,
    maxTempC: climate.maxTempC,
    maxRelHumidityPct: fill.take(climate.maxRelHumidityPct, 'climate.maxRelHumidityPct', 'climate.maxRelHumidityPct'),
    heater: heater ? { ...heater, priceMinor: heater.priceMinor ?? 0, owned: heater.owned ?? false } : null,
    exhaust: exhaust
      ? {
          ...exhaust,
          minAirflowM3H: fill.take(
            exhaust.minAirflowM3H,
            'climate.exhaust.minAirflowM3H',
            'climate.exhaust.minAirflowM3H',
          ),
          priceMinor: exhaust.priceMinor ?? 0,
          owned: exhaust.owned ?? false,
        }
      : null,
    circulationW: climate.circulation?.inputPowerW ?? 0,
  };
}

function fillWater({ water }: ScenarioDocument, fill: Filling): ResolvedScenario['water'] {
  const flood = water?.flood;
  return {
    reservoirL: fill.take(water?.reservoirL, 'water.reservoirL', 'water.reservoirL'),
    coveredFrac: fill.take(water?.coveredFrac, 'water.coveredFrac', 'water.coveredFrac'),
    transpiration: water?.transpiration ?? fill.model(),
    pumpW: water?.pump?.inputPowerW ?? 0,
    flood: {
      minutes: fill.take(flood?.minutes, 'water.flood.minutes', 'water.flood.minutes'),
      everyMinutes: fill.take(flood?.everyMinutes, 'water.flood.everyMinutes', 'water.flood.everyMinutes'),
    },
  };
}

function fillPower({ power }: ScenarioDocument, fill: Filling): ResolvedScenario['power'] {
  const american = power.tariff.currency === 'USD';
  const take = (name: 'fixedPerMonth' | 'taxPct' | 'householdBaseKwhPerMonth') =>
    fill.take(power.tariff[name], `tariff.${name}`, `power.tariff.${name}`);
  return {
    supplyV: power.supplyV,
    circuits: power.circuits.map((circuit, index) => ({
      ...circuit,
      otherLoadsW: fill.take(circuit.otherLoadsW, 'circuit.otherLoadsW', `power.circuits[${index}].otherLoadsW`),
    })),
    tariff: {
      ...power.tariff,
      fixedPerMonth: take('fixedPerMonth'),
      taxPct: take('taxPct'),
      householdBaseKwhPerMonth: take('householdBaseKwhPerMonth'),
    },
    co2GKwh: fill.take(power.co2GKwh, american ? 'power.co2GKwh.USD' : 'power.co2GKwh', 'power.co2GKwh'),
  };
}

/** Fills in what a scenario leaves out and lists every default that was used. */
export function resolveScenario(document: ScenarioDocument): { scenario: ResolvedScenario; assumptions: Assumption[] } {
  const fill = new Filling();
  const { room } = document;
  const scenario: ResolvedScenario = {
    name: document.name,
    year: fill.take(document.calendar?.year, 'calendar.year', 'calendar.year'),
    place: document.place,
    room: {
      airTempC: room.airTempC,
      relHumidityPct: room.relHumidityPct ?? {
        kind: 'constant',
        value: fill.take(undefined, 'room.relHumidityPct', 'room.relHumidityPct'),
      },
      slabTempC: room.slabTempC ?? { kind: 'offset', value: fill.take(undefined, 'room.slabTempC', 'room.slabTempC') },
      designTempC: room.designTempC,
      hotDayTempC: room.hotDayTempC,
    },
    tent: fillTent(document, fill),
    boxes: document.boxes ?? [],
    tiers: document.tiers.map((tier, index) => fillTier(tier, index, document.tent.heightM, fill)),
    fixtures: document.fixtures.map((fixture, index) => fillFixture(fixture, index, fill)),
    placements: document.placements.map((placement, index) => ({
      ...placement,
      tier: placement.tier ?? null,
      dimFrac: fill.take(placement.dimFrac, 'placement.dimFrac', `placements[${index}].dimFrac`),
    })),
    schedules: document.schedules,
    climate: fillClimate(document, fill),
    water: fillWater(document, fill),
    power: fillPower(document, fill),
  };
  return { scenario, assumptions: fill.assumptions };
}
