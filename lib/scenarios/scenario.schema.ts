import { z } from 'zod';
import type { Action } from '../auth/permissions';
import type { ResolvedTarget } from '../crops/crop.schema';
import type { Evaluation } from '../evaluation/evaluate-scenario';
import type { Fixture } from '../fixtures/fixture.schema';
import { gardenParams, nameField, newIdField, versionField, type Garden } from '../gardens/garden.schema';
import type { Room } from '../rooms/room.schema';
import type { ReferenceTariff } from '../tariffs/default-tariff';
import type { Tent } from '../tents/tent.schema';
import { planSchema, type Plan } from './plan.schema';

const note = z.string().max(500, 'At most 500 characters.');

export const scenarioParams = gardenParams.extend({ scenarioId: z.uuid() });
export const scenarioInputSchema = z.strictObject({
  scenarioId: newIdField,
  name: nameField,
  note: note.default(''),
  plan: planSchema.optional(),
});
export const scenarioCopySchema = z.strictObject({
  scenarioId: newIdField,
  name: nameField.optional(),
  plan: planSchema.optional(),
});
export const scenarioChangeSchema = z.strictObject({
  version: versionField,
  name: nameField.optional(),
  note: note.optional(),
  plan: planSchema.optional(),
});

export type ScenarioInput = z.infer<typeof scenarioInputSchema>;
export type ScenarioCopy = z.infer<typeof scenarioCopySchema>;
export type ScenarioChange = z.infer<typeof scenarioChangeSchema>;

export interface Scenario {
  scenarioId: string;
  tentId: string;
  name: string;
  note: string;
  plan: Plan;
  version: number;
  updatedAt: string;
  updatedByName: string | null;
}

/** Everything that a tent's pages need, read in one go. */
export interface Workbench {
  scenario: Scenario;
  tent: Tent;
  room: Room;
  garden: Garden;
  fixtures: Fixture[];
  /** For the tiers' crops; where a crop has no light figures it is missing. */
  targets: ResolvedTarget[];
  /** The price that stands in where the room's is not known. */
  referenceTariff: ReferenceTariff;
  siblings: { scenarioId: string; name: string; updatedAt: string; tierTopsM: number[] }[];
  /** W that other tents' current scenarios put on each circuit. */
  otherLoads: Record<string, number>;
  can: Record<Action, boolean>;
}

export interface EvaluatedScenario {
  workbench: Workbench;
  evaluation: Evaluation;
}
