import { z } from 'zod';
import { idField, list, oneOf, quantity, words } from '../evaluation/fields';
import { co2Field, placeSchema, roomClimateSchema, supplyVoltage } from '../evaluation/scenario-fields';
import { tariffSchema } from '../evaluation/tariff.schema';
import { gardenParams, nameField, newIdField, versionField } from '../gardens/garden.schema';

export const roomCircuitSchema = z.strictObject({
  id: idField,
  name: words({ most: 60 }),
  ratingA: quantity({ min: 1, max: 200, unit: 'A' }),
  otherLoadsW: quantity({ min: 0, max: 50_000, unit: 'W' }).optional(),
});

export const roomPowerSchema = z
  .strictObject({
    supplyV: supplyVoltage(),
    circuits: list(roomCircuitSchema, { most: 16 }),
    /** null: "I don't know"; a reference price of the currency is taken and marked. */
    tariff: tariffSchema.nullable(),
    co2GKwh: co2Field().optional(),
  })
  .refine(({ circuits }) => new Set(circuits.map((circuit) => circuit.id)).size === circuits.length, {
    error: 'Two circuits have one id.',
    path: ['circuits'],
  });

const residualCurrentDevice = oneOf(['yes', 'no', 'unknown']);

export const roomParams = gardenParams.extend({ roomId: z.uuid() });
export const roomInputSchema = z.strictObject({
  roomId: newIdField,
  name: nameField,
  place: placeSchema,
  climate: roomClimateSchema,
  power: roomPowerSchema,
  residualCurrentDevice: residualCurrentDevice.default('unknown'),
});
export const roomChangeSchema = z.strictObject({
  version: versionField,
  name: nameField.optional(),
  place: placeSchema.optional(),
  climate: roomClimateSchema.optional(),
  power: roomPowerSchema.optional(),
  residualCurrentDevice: residualCurrentDevice.optional(),
});

export type RoomInput = z.input<typeof roomInputSchema>;
export type RoomChange = z.infer<typeof roomChangeSchema>;
export type RoomPower = z.infer<typeof roomPowerSchema>;

export interface Room {
  roomId: string;
  gardenId: string;
  name: string;
  place: z.infer<typeof placeSchema>;
  climate: z.infer<typeof roomClimateSchema>;
  power: RoomPower;
  residualCurrentDevice: 'yes' | 'no' | 'unknown';
  version: number;
}
