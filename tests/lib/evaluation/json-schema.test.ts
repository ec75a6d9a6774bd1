import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { jsonSchemas, jsonSchemaText } from '@/lib/evaluation/json-schema';

describe('the JSON Schema files under public/schemas', () => {
  it.each(Object.entries(jsonSchemas()))(
    '%s is what the schema makes; write it anew when the schema changes',
    (name, schema) => expect(readFileSync(`public/schemas/${name}`, 'utf8')).toBe(jsonSchemaText(schema)),
  );
});
