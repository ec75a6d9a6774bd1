import { z } from 'zod';
import { idField, list, words } from '../evaluation/fields';
import {
  appSchema,
  boxSchema,
  calendarSchema,
  climateSchema,
  placementSchema,
  rangeSchema,
  scheduleSchema,
  tierShape,
  waterSchema,
} from '../evaluation/scenario-fields';

/** What a crop is to a tier: its name and stage. The figures follow the garden's targets and the reference. */
export const targetRefSchema = z.strictObject({ crop: words({ most: 120 }), stage: words({ most: 60 }) });

export const planTierSchema = z.strictObject({ ...tierShape, targetRef: targetRefSchema.nullish() });

/** A scenario's own part of scenario/1; tent, room and lamps come from their rows. */
export const planSchema = z.strictObject({
  calendar: calendarSchema.optional(),
  tiers: list(planTierSchema, { most: 8 }),
  placements: list(placementSchema, { most: 64 }),
  schedules: list(scheduleSchema, { most: 64 }),
  climate: climateSchema,
  water: waterSchema.optional(),
  boxes: list(boxSchema, { most: 32 }).optional(),
  range: rangeSchema.optional(),
  /** What each circuit of the room carries: kinds of load or placements. Left out: the first carries all. */
  circuitLoads: z.record(idField, list(idField, { most: 80 })).optional(),
  app: appSchema.optional(),
});

export type Plan = z.infer<typeof planSchema>;
export type PlanTier = Plan['tiers'][number];
