import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { evaluateDocument } from '@/lib/evaluation/evaluate-document';
import type { Evaluation } from '@/lib/evaluation/evaluate-scenario';

interface Case {
  id: string;
  title: string;
  source: string;
  scenario: Record<string, unknown>;
  expect: Record<string, { value?: number; rel?: number; abs?: number; equals?: unknown }>;
}

const { cases } = JSON.parse(readFileSync('tests/truth/climate/cases.json', 'utf8')) as { cases: Case[] };
const at = (of: unknown, dots: string): unknown =>
  dots.split('.').reduce<unknown>((value, key) => (value as Record<string, unknown> | undefined)?.[key], of);

function meets(result: unknown, expected: Case['expect']) {
  for (const [dots, { value, rel, abs, equals }] of Object.entries(expected)) {
    const got = at(result, dots);
    if (value === undefined) expect(got, dots).toBe(equals);
    else {
      const room = abs ?? rel! * Math.abs(value);
      expect(Math.abs((got as number) - value), `${dots}: ${String(got)} against ${value}`).toBeLessThanOrEqual(room);
    }
  }
}

const folder = mkdtempSync(path.join(tmpdir(), 'cellarsun-cases-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const command = ['--import', 'tsx', 'lib/evaluation/evaluate.cli.ts'];
const fileOf = (name: string, text: string) => {
  const file = path.join(folder, name);
  writeFileSync(file, text);
  return file;
};

describe('whole documents, tests/truth/climate', () => {
  it.each(cases.map((each) => [each.id, each] as const))('%s meets the expected figures', (_id, each) => {
    const evaluated = evaluateDocument(each.scenario);
    expect(evaluated.ok).toBe(true);
    if (evaluated.ok) meets(evaluated.result, each.expect);
  });

  it('the command prints the same result to the last bit, but for the time it took', () => {
    for (const id of ['B2', 'bill-tiers-prorated-taxed', 'circuit-over']) {
      const each = cases.find((candidate) => candidate.id === id)!;
      const printed = JSON.parse(
        execFileSync(process.execPath, [...command, fileOf(`${id}.json`, JSON.stringify(each.scenario))], {
          encoding: 'utf8',
        }),
      ) as Evaluation;
      const here = evaluateDocument(each.scenario);
      if (!here.ok) throw new Error('the case does not parse');
      expect({ ...printed, elapsedMs: null }).toEqual(JSON.parse(JSON.stringify({ ...here.result, elapsedMs: null })));
      meets(printed, each.expect);
    }
  }, 60_000);

  it('the command tells problems on stderr, one a line, and nothing on stdout', () => {
    const broken = { ...cases[0]!.scenario, tent: { ...(cases[0]!.scenario['tent'] as object), widthM: -3, extra: 1 } };
    const files = [
      fileOf('broken.json', JSON.stringify(broken)),
      fileOf('not.json', '{"schema":'),
      path.join(folder, 'missing.json'),
    ];
    const expected = [/\$\.tent\.widthM: -3; allowed: 0\.1 to 20 m;[^\n]*\n[^\n]*extra/, /not JSON/, /cannot be read/];
    files.forEach((file, index) => {
      const run = spawnSync(process.execPath, [...command, file], { encoding: 'utf8' });
      expect(run.status).toBe(2);
      expect(run.stdout).toBe('');
      expect(run.stderr).toMatch(expected[index]!);
    });
  }, 60_000);
});
