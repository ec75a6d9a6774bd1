import fc from 'fast-check';

type Path = (string | number)[];

function pathsOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  const own = path.length > 0 ? [path] : [];
  return [
    ...own,
    ...Object.entries(value).flatMap(([key, child]) =>
      pathsOf(child, [...path, Array.isArray(value) ? Number(key) : key]),
    ),
  ];
}

const BAD = [
  undefined,
  null,
  NaN,
  Infinity,
  -Infinity,
  -1,
  -1e9,
  1e12,
  1e300,
  0,
  '',
  'abc',
  '12',
  true,
  [],
  {},
  [1, 2],
  { value: 1 },
  '__proto__',
  0.5,
  25,
];

function withChange(document: unknown, path: Path, change: unknown): unknown {
  const copy = structuredClone(document) as Record<string, unknown>;
  let at: Record<string | number, unknown> = copy;
  for (const key of path.slice(0, -1)) at = at[key] as Record<string | number, unknown>;
  const last = path.at(-1)!;
  if (change === undefined && !Array.isArray(at)) delete at[last];
  else at[last] = change;
  return copy;
}

/** A valid document with one to three of its fields, any of them, made wrong in type, size or presence, or with a key too many. */
export function fuzzedDocument(document: object): fc.Arbitrary<unknown> {
  const paths = pathsOf(document);
  const change = fc.oneof(
    { weight: 5, arbitrary: fc.constantFrom(...BAD) },
    fc.double(),
    fc.string({ maxLength: 12 }),
    fc.jsonValue({ maxDepth: 2 }),
  );
  const changes = fc.array(fc.tuple(fc.constantFrom(...paths), change), { minLength: 1, maxLength: 3 });
  return fc.tuple(changes, fc.boolean()).map(([list, extra]) => {
    let broken: unknown = document;
    for (const [path, value] of list) {
      try {
        broken = withChange(broken, path, value);
      } catch {
        // An earlier change took this place away.
      }
    }
    return extra ? { ...(broken as object), unknownKey: 1 } : broken;
  });
}
