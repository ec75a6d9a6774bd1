/** Edits of what blows, burns and drinks. As in `edit-plan.ts`, each gives a new plan. */
import type { ClimateControl, ExhaustFan, Heater, WaterSystem } from '@/physics/plan/scenario-document';
import { put, type EditablePlan } from './edit-plan';

type SetPoints = Pick<ClimateControl, 'dayTempC' | 'nightTempC' | 'maxTempC' | 'maxRelHumidityPct'>;

export function setSetPoints<P extends EditablePlan>(plan: P, patch: Partial<SetPoints>): P {
  return { ...plan, climate: put(plan.climate, patch) };
}

/** Changes the heater, puts one in, or (null) takes it out. */
export function setHeater<P extends EditablePlan>(plan: P, patch: Partial<Heater> | null): P {
  const heater = patch && put<Heater>(plan.climate.heater ?? { ratedPowerW: 300, clearanceM: null }, patch);
  return { ...plan, climate: { ...plan.climate, heater } };
}

export function setExhaust<P extends EditablePlan>(plan: P, patch: Partial<ExhaustFan> | null): P {
  const exhaust = patch && put<ExhaustFan>(plan.climate.exhaust ?? { maxAirflowM3H: 100, inputPowerW: 15 }, patch);
  return { ...plan, climate: { ...plan.climate, exhaust } };
}

export function setCirculation<P extends EditablePlan>(plan: P, inputPowerW: number | null): P {
  const circulation = inputPowerW === null ? null : { inputPowerW };
  return { ...plan, climate: { ...plan.climate, circulation } };
}

export function setWater<P extends EditablePlan>(plan: P, patch: Partial<WaterSystem> | null): P {
  if (patch === null) {
    const dry = { ...plan };
    delete dry.water;
    return dry;
  }
  return { ...plan, water: put<WaterSystem>(plan.water ?? {}, patch) };
}

export function setPump<P extends EditablePlan>(plan: P, inputPowerW: number | null): P {
  return setWater(plan, { pump: inputPowerW === null ? null : { inputPowerW } });
}

/** A reservoir and a pump of common sizes, to be changed. */
export function putInWater<P extends EditablePlan>(plan: P): P {
  return setPump(setWater(plan, { reservoirL: 40 }), 20);
}

export function setFlood<P extends EditablePlan>(plan: P, patch: Partial<NonNullable<WaterSystem['flood']>>): P {
  return setWater(plan, { flood: { minutes: 10, everyMinutes: 120, ...plan.water?.flood, ...patch } });
}
