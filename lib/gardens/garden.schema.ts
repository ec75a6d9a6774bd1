import { z } from 'zod';
import { NOT_ONE_LINE, ONE_LINE } from '../format/one-line';
import type { Role } from '../db/database';

export const gardenParams = z.object({ gardenId: z.uuid() });

export const nameField = z
  .string({ error: 'Type a name.' })
  .trim()
  .min(1, 'Type a name.')
  .max(80, 'At most 80 characters.')
  .regex(ONE_LINE, NOT_ONE_LINE);
export const versionField = z.int({ error: 'Say which version you saw.' }).positive();

/** A new row may bring its own id, so that sending it twice makes it once. */
export const newIdField = z.uuid({ error: 'A new id is a random UUID.' }).optional();

export const currencyField = z
  .string({ error: 'Choose a currency.' })
  .regex(/^[A-Z]{3}$/, 'Type the three letters of a currency, such as EUR.');

export const gardenInputSchema = z.strictObject({ gardenId: newIdField, name: nameField, currency: currencyField });
export type GardenInput = z.infer<typeof gardenInputSchema>;

export const gardenChangeSchema = z.strictObject({
  version: versionField,
  name: nameField.optional(),
  currency: currencyField.optional(),
});
export type GardenChange = z.infer<typeof gardenChangeSchema>;

export const roleField = z.enum(['owner', 'planner', 'tender', 'viewer'], { error: 'Choose one of the four roles.' });
export const memberParams = gardenParams.extend({ accountId: z.uuid() });
export const memberChangeSchema = z.strictObject({ role: roleField });

export const joinCodeParams = gardenParams.extend({ joinCodeId: z.uuid() });
export const joinCodeInputSchema = z.strictObject({
  role: z.enum(['planner', 'tender', 'viewer'], { error: 'Choose planner, tender or viewer.' }),
});
export const joinSchema = z.strictObject({
  code: z.string({ error: 'Type the code you were given.' }).trim().min(1, 'Type the code you were given.').max(120),
});

export interface Garden {
  gardenId: string;
  name: string;
  currency: string;
  version: number;
  role: Role;
  memberCount: number;
}

export interface Member {
  accountId: string;
  displayName: string;
  email: string;
  role: Role;
  you: boolean;
}

export interface JoinCode {
  joinCodeId: string;
  role: Exclude<Role, 'owner'>;
  expiresAt: string;
}
