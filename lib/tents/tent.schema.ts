import { z } from 'zod';
import { quantity } from '../evaluation/fields';
import { tentBodySchema } from '../evaluation/scenario-fields';
import { gardenParams, nameField, newIdField, versionField } from '../gardens/garden.schema';

export const tentParams = gardenParams.extend({ tentId: z.uuid() });
export const tentInputSchema = z.strictObject({
  tentId: newIdField,
  roomId: z.uuid({ error: 'Choose a room.' }),
  name: nameField,
  body: tentBodySchema,
  tierCount: quantity({ min: 1, max: 8, unit: 'tiers', integer: true }),
});
export const tentChangeSchema = z.strictObject({
  version: versionField,
  name: nameField.optional(),
  roomId: z.uuid().optional(),
  body: tentBodySchema.optional(),
  currentScenarioId: z.uuid().optional(),
});

export type TentInput = z.infer<typeof tentInputSchema>;
export type TentChange = z.infer<typeof tentChangeSchema>;

export interface Tent {
  tentId: string;
  roomId: string;
  name: string;
  body: z.infer<typeof tentBodySchema>;
  currentScenarioId: string | null;
  version: number;
}
