/** What the app may use of the physics, in the browser and on the server alike. */
export { evaluateScenario, type EvaluateOptions } from '@/physics/plan/evaluate-scenario';
export { evaluateLightScene } from '@/physics/light/evaluate-light-scene';
export { createLightCache, type LightCache } from '@/physics/light/light-field';
export { verticalSlice, type SliceRequest, type VerticalSlice } from '@/physics/light/vertical-slice';
export { explainFigure } from './explain-figure';
export type { Explanation, ExplanationTerm } from '@/physics/plan/explain';
export { heaterNeedW, worstColdState } from '@/physics/plan/worst-cold-state';
export { resolveScenario } from '@/physics/plan/resolve-scenario';
export { physicsVersion } from '@/physics/plan/physics-version';
export { defaults } from '@/physics/plan/defaults';
export type {
  Assumption,
  Caution,
  CircuitResult,
  Device,
  Evaluation,
  HeatState,
  HotState,
  MonthResult,
  Standing,
  TierResult,
  Verdict,
  YearResult,
} from '@/physics/plan/evaluation-document';
export type {
  FixtureType,
  Placement,
  ScenarioDocument,
  Target,
  Tariff,
  TentBody,
  Tier,
} from '@/physics/plan/scenario-document';
export type { Distribution, LightResult, LightScene, Vec3 } from '@/physics/light/light-documents';
