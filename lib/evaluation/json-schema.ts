import { z } from 'zod';
import { lightSceneSchema } from './light-scene.schema';
import { scenarioSchema } from './scenario.schema';

/** The documents' forms for other programs, made from the schemas that check them; served under /schemas/. */
export const jsonSchemas = (): Record<string, unknown> => ({
  'scenario-1.json': {
    title: 'scenario/1',
    ...z.toJSONSchema(scenarioSchema, { io: 'input', unrepresentable: 'any' }),
  },
  'light-scene-1.json': {
    title: 'light-scene/1',
    ...z.toJSONSchema(lightSceneSchema, { io: 'input', unrepresentable: 'any' }),
  },
});

export const jsonSchemaText = (schema: unknown): string => `${JSON.stringify(schema, null, 2)}\n`;
