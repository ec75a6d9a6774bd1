/** What is taken where a plan is silent, for fields that mark it as a default and let a person confirm it. */
import { defaults, type DefaultKey } from '@/physics/plan/defaults';

export interface PlanDefault {
  value: number;
  why: string;
}

export function planDefault(key: DefaultKey): PlanDefault {
  const { value, why } = defaults[key];
  return { value, why };
}
