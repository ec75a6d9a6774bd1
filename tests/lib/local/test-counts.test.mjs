import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, test } from 'vitest';
import { countPlaywright, countVitest } from '../../../lib/local/test-counts.mjs';

const folder = mkdtempSync(path.join(tmpdir(), 'cellarsun-counts-'));
function report(content) {
  const file = path.join(folder, `${Math.random()}.json`);
  writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
  return file;
}
const suite = (status, results) => ({ status, assertionResults: results.map((each) => ({ status: each })) });
const vitest = (passed, failed, testResults) => ({
  numPassedTests: passed,
  numFailedTests: failed,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults,
});

describe('a run is never counted as better than it was', () => {
  test('a file that could not be loaded is one failure beside the failed tests', () => {
    const file = report(vitest(1, 1, [suite('failed', ['passed', 'failed']), suite('failed', [])]));
    expect(countVitest(file, 1)).toMatchObject({ passed: 1, failed: 2 });
  });

  test.each([
    ['a report that is missing', path.join(folder, 'nothing.json'), 0],
    ['a report that was cut short', report('{"numPassedTests": 9'), 0],
    ['a run of no test at all', report(vitest(0, 0, [])), 0],
    ['a bad ending without a failed test', report(vitest(7, 0, [suite('passed', ['passed'])])), 1],
  ])('%s is a failure', (_, file, code) => {
    expect(countVitest(file, code).failed).toBe(1);
  });

  test('a browser test that passed at a second try is a failure', () => {
    const file = report({ errors: [], stats: { expected: 4, unexpected: 1, flaky: 2, skipped: 1 } });
    expect(countPlaywright(file, 1)).toEqual({ passed: 4, failed: 3, skipped: 1 });
  });

  test('a good run is a good run', () => {
    const file = report({ errors: [], stats: { expected: 4, unexpected: 0, flaky: 0, skipped: 0 } });
    expect(countPlaywright(file, 0)).toEqual({ passed: 4, failed: 0, skipped: 0 });
    expect(countVitest(report(vitest(7, 0, [suite('passed', ['passed'])])), 0)).toMatchObject({ passed: 7, failed: 0 });
  });
});
