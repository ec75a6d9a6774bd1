import type { z } from 'zod';
import type { LightScene } from '@/physics/light/light-documents';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { expectationOf } from './fields';
import { lightSceneSchema } from './light-scene.schema';
import { scenarioSchema } from './scenario.schema';

/** One thing wrong with a document: where, what stands there, what may. */
export interface DocumentProblem {
  path: string;
  value: unknown;
  range: string;
  unit: string;
  message: string;
}

export type Parsed<T> = { ok: true; value: T } | { ok: false; problems: DocumentProblem[] };

const MOST_PROBLEMS = 100;

export function pathText(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, key) => (typeof key === 'number' ? `${text}[${key}]` : text === '' ? String(key) : `${text}.${String(key)}`),
    '',
  );
}

function valueAt(input: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, key) =>
      typeof value === 'object' && value !== null ? (value as Record<PropertyKey, unknown>)[key] : undefined,
    input,
  );
}

/** Short enough for a line: a long list is no help to anybody. */
function brief(value: unknown): unknown {
  if (value === undefined) return 'missing';
  if (typeof value === 'number' && !Number.isFinite(value)) return String(value);
  const text = JSON.stringify(value) ?? String(value);
  return text.length > 80 ? `${text.slice(0, 77)}…` : value;
}

type Issue = z.core.$ZodIssue;

const KINDS = new Map([
  ['object', 'an object'],
  ['record', 'an object'],
  ['array', 'a list'],
  ['tuple', 'a list'],
  ['string', 'a text'],
  ['number', 'a number'],
  ['boolean', 'true or false'],
]);
const UNKNOWN_KEY = 'no such key';
const UNSAID = 'see message';

/** Where the field itself says nothing of what it takes. */
export const isUnsaid = (range: string): boolean =>
  range === UNKNOWN_KEY || range === UNSAID || [...KINDS.values()].includes(range);

/** A union's own issue says only that nothing fitted; the branch that came furthest says why. */
function innermost(issue: Issue): Issue[] {
  if (issue.code !== 'invalid_union' || !issue.errors || issue.errors.length === 0) return [issue];
  const depth = (branch: Issue[]) => Math.max(0, ...branch.map((each) => each.path.length));
  const best = [...issue.errors].sort((a, b) => depth(b) - depth(a))[0]!;
  if (depth(best) === 0) {
    const told = issue.errors.flat().find((each) => expectationOf(each));
    // A union with words of its own knows better than any branch.
    return told && issue.message.startsWith('Invalid input') ? [{ ...told, path: issue.path } as Issue] : [issue];
  }
  return best.flatMap((each) => innermost({ ...each, path: [...issue.path, ...each.path] } as Issue));
}

function problemOf(issue: Issue, input: unknown): DocumentProblem[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      path: pathText([...issue.path, key]),
      value: brief(valueAt(input, [...issue.path, key])),
      range: UNKNOWN_KEY,
      unit: '',
      message: 'This key is not known here. Take it out or correct its name.',
    }));
  }
  const value = valueAt(input, issue.path);
  const kind = issue.code === 'invalid_type' ? KINDS.get(issue.expected) : undefined;
  const wanted = kind ?? kindsOf(issue);
  const { range, unit } = expectationOf(issue) ?? { range: wanted ?? UNSAID, unit: '' };
  return [{ path: pathText(issue.path), value: brief(value), range, unit, message: messageOf(issue, value, wanted) }];
}

/** The kinds that a union tells its branches by, where none was met. */
function kindsOf(issue: Issue): string | undefined {
  const options = issue.code === 'invalid_union' && 'options' in issue ? issue.options : undefined;
  return Array.isArray(options) ? `one of: ${options.join(', ')}` : undefined;
}

/** The field's own words, or, where zod has only its own, what kind of thing belongs here. */
function messageOf(issue: Issue, value: unknown, wanted: string | undefined): string {
  if (!issue.message.startsWith('Invalid ')) return issue.message;
  return `${value === undefined ? 'This is missing.' : 'This has the wrong form.'}${wanted ? ` Give ${wanted}.` : ''}`;
}

export function toProblems(error: z.ZodError, input: unknown): DocumentProblem[] {
  return error.issues
    .flatMap(innermost)
    .flatMap((issue) => problemOf(issue, input))
    .slice(0, MOST_PROBLEMS);
}

function parse<T>(schema: z.ZodType<T>, input: unknown): Parsed<T> {
  const result = schema.safeParse(input);
  return result.success ? { ok: true, value: result.data } : { ok: false, problems: toProblems(result.error, input) };
}

export const parseScenarioDocument = (input: unknown): Parsed<ScenarioDocument> => parse(scenarioSchema, input);
export const parseLightScene = (input: unknown): Parsed<LightScene> => parse(lightSceneSchema, input);
