import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseJsonText } from '@/lib/http/json-text';

const refusal = (text: string) => {
  try {
    parseJsonText(text);
  } catch (error) {
    return error;
  }
  return null;
};

describe('JSON that is to be kept', () => {
  it('is read as JSON.parse reads it, whatever proper text it holds', () => {
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 5 }), (value) => {
        const text = JSON.stringify(value);
        if (/\\u0000|\\ud[89a-f]/i.test(text)) return;
        expect(parseJsonText(text)).toEqual(JSON.parse(text));
      }),
    );
    expect(parseJsonText('"Kräuter 🌱"')).toBe('Kräuter 🌱');
  });

  it.each([
    ['a NUL', '{"name":"a\\u0000b"}'],
    ['a NUL in a key', '{"a\\u0000b":1}'],
    ['the first half of a pair', '["\\ud83c"]'],
    ['the second half of a pair', '["x\\udf31"]'],
    ['two halves the wrong way round', '["\\udf31\\ud83c"]'],
  ])('is refused with %s in it, which PostgreSQL does not keep', (_, text) => {
    expect(refusal(text)).toMatchObject({ status: 422, code: 'not-keepable' });
  });

  it('is refused when nested without end, before anything of ours walks into it', () => {
    const nested = (depth: number) => '['.repeat(depth) + ']'.repeat(depth);
    expect(refusal(nested(40))).toBeNull();
    expect(refusal(nested(41))).toMatchObject({ status: 422 });
    expect(refusal(nested(120_000))).toMatchObject({ status: 422 });
    expect(refusal('{"a":'.repeat(40_000) + '1' + '}'.repeat(40_000))).toMatchObject({ status: 422 });
  });

  it('is refused as no JSON at all with a bracket missing', () => {
    for (const text of ['', '{', '{"a":NaN}', "{'a':1}", '\u0000'])
      expect(refusal(text)).toMatchObject({ status: 400 });
  });
});
