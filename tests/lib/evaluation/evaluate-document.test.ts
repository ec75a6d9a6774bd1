import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { POST } from '@/app/api/v1/evaluate/route';
import { evaluateDocument } from '@/lib/evaluation/evaluate-document';

const { cases } = JSON.parse(readFileSync('tests/truth/climate/cases.json', 'utf8')) as {
  cases: { id: string; scenario: Record<string, unknown> }[];
};
const scenario = cases[0]!.scenario;
const scene = (JSON.parse(readFileSync('tests/truth/light/p01_black_point.json', 'utf8')) as { scene: object }).scene;

const post = (body: BodyInit, headers: Record<string, string> = {}) =>
  POST(
    new Request('http://localhost:3000/api/v1/evaluate', {
      method: 'POST',
      headers: { 'content-type': 'application/json', ...headers },
      body,
    }),
  );
const untimed = (result: object) => JSON.parse(JSON.stringify({ ...result, elapsedMs: null })) as unknown;

const folder = mkdtempSync(path.join(tmpdir(), 'cellarsun-evaluate-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function command(text: string) {
  const file = path.join(folder, 'document.json');
  writeFileSync(file, text);
  return spawnSync(process.execPath, ['--import', 'tsx', 'lib/evaluation/evaluate.cli.ts', file], { encoding: 'utf8' });
}

const nested = (levels: number) => `${'['.repeat(levels)}${']'.repeat(levels)}`;

describe('a document', () => {
  it('of either schema is evaluated, and tells how long light and year took', () => {
    const evaluated = evaluateDocument(scenario);
    if (!evaluated.ok || evaluated.result.schema !== 'evaluation/1') throw new Error('a valid scenario was refused');
    expect(evaluated.result.elapsedMs.light).toBeGreaterThan(0);
    expect(evaluated.result.elapsedMs.year).toBeGreaterThan(0);
    const lit = evaluateDocument(scene);
    if (!lit.ok || lit.result.schema !== 'light-result/1') throw new Error('a valid scene was refused');
    expect(lit.result.elapsedMs).toBeGreaterThan(0);
  });

  it.each([
    ['nothing', undefined],
    ['null', null],
    ['a number', 7],
    ['a list', [1, 2]],
    ['another schema', { schema: 'scenario/2' }],
    ['a schema that is no text', { schema: { a: 1 } }],
    ['nesting without end', { ...scenario, app: JSON.parse(nested(5000)) as unknown }],
    ['a figure nested without end', { ...scenario, name: JSON.parse(nested(5000)) as unknown }],
  ])('that is %s is a problem with path, value, range and a sentence, not a crash', (_what, input) => {
    const evaluated = evaluateDocument(input);
    if (evaluated.ok) throw new Error('it was taken');
    for (const { path: where, value, range, message } of evaluated.problems) {
      expect(typeof where).toBe('string');
      expect(JSON.stringify(value).length).toBeLessThan(200);
      expect(range).not.toBe('');
      expect(message).toMatch(/\.$/);
    }
  });

  it('keeps what the app notes in it, whatever that is, and physics never looks', () => {
    const noted = evaluateDocument({ ...scenario, app: { notes: ['x'], deep: { a: [1, { b: null }] } } });
    const plain = evaluateDocument(scenario);
    if (!noted.ok || !plain.ok) throw new Error('it was refused');
    expect(untimed(noted.result)).toEqual(untimed(plain.result));
  });
});

describe('the route', () => {
  it('answers a script that is nobody and names no origin, and is no other than the command', async () => {
    for (const document of [scenario, scene]) {
      const text = JSON.stringify(document);
      const response = await post(text);
      expect(response.status).toBe(200);
      expect(response.headers.get('cache-control')).toBe('no-store');
      const { stdout, status } = command(text);
      expect(status).toBe(0);
      expect(untimed((await response.json()) as object)).toEqual(untimed(JSON.parse(stdout) as object));
    }
  }, 60_000);

  it('names each problem as the command does, with 422', async () => {
    const broken = JSON.stringify({
      ...scenario,
      tent: { ...(scenario['tent'] as object), fabricUWM2K: -3, colour: 'red' },
    });
    const response = await post(broken);
    expect(response.status).toBe(422);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    const { problems } = (await response.json()) as { problems: { path: string; value: unknown; range: string }[] };
    expect(problems.map((each) => each.path)).toEqual(['tent.fabricUWM2K', 'tent.colour']);
    expect(problems[0]).toMatchObject({ value: -3, range: '0 to 20', unit: 'W/m²K' });
    const { stdout, stderr, status } = command(broken);
    expect([status, stdout]).toEqual([2, '']);
    expect(
      stderr
        .trim()
        .split('\n')
        .map((line) => line.split(':')[0]),
    ).toEqual(['$.tent.fabricUWM2K', '$.tent.colour']);
  }, 60_000);

  it('refuses more than 256 kB with 413 before it reads them, what is no JSON with 400, what says it is none with 415', async () => {
    expect((await post('x'.repeat(256 * 1024 + 1))).status).toBe(413);
    expect((await post('{"schema":')).status).toBe(400);
    expect((await post('{}', { 'content-type': 'text/plain' })).status).toBe(415);
    expect((await post(nested(200_000).slice(0, 200_000))).status).toBeLessThan(500);
  });

  it('refuses a page of another site', async () => {
    expect((await post(JSON.stringify(scene), { 'sec-fetch-site': 'cross-site' })).status).toBe(403);
  });
});

describe('the command', () => {
  it('refuses a file that is too large, and says how large it may be', () => {
    const { status, stdout, stderr } = command(JSON.stringify({ ...scenario, app: { notes: 'x'.repeat(300_000) } }));
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).toMatch(/at most 262144 bytes/);
  }, 30_000);

  it('refuses nesting without end in one line', () => {
    const { status, stdout, stderr } = command(`{"schema":"scenario/1","app":${nested(20_000)}}`);
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr.trim().split('\n')).toHaveLength(1);
    expect(stderr).toMatch(/nested too deeply/);
  }, 30_000);
});
