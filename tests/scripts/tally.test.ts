import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { sum, tallyPlaywright, tallyVitest } from '@/scripts/lib/tally.mjs';

const folder = mkdtempSync(join(tmpdir(), 'tally-'));
afterAll(() => rmSync(folder, { recursive: true }));

const report = (content: object) => {
  const file = join(folder, 'report.json');
  writeFileSync(file, JSON.stringify(content));
  return file;
};
const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((one) => ({ status: one })),
});
const absent = join(folder, 'absent.json');

describe('the count of vitest', () => {
  it('is what the report says', () => {
    const testResults = [file('passed', 'passed', 'passed'), file('failed', 'passed', 'failed')];
    const counted = tallyVitest(report({ numPassedTests: 3, numFailedTests: 1, testResults }), 1);
    expect(counted).toEqual({ passed: 3, failed: 1 });
  });

  it('has a failure for a file that could not be loaded', () => {
    const testResults = [file('passed', 'passed'), file('failed')];
    expect(tallyVitest(report({ numPassedTests: 1, numFailedTests: 0, testResults }), 1)).toEqual({
      passed: 1,
      failed: 1,
    });
  });

  it('has a failure when the runner failed and no test did', () => {
    const testResults = [file('passed', 'passed')];
    expect(tallyVitest(report({ numPassedTests: 1, numFailedTests: 0, testResults }), 1)).toEqual({
      passed: 1,
      failed: 1,
    });
  });

  it('has a failure when nothing ran, whatever the runner says', () => {
    expect(tallyVitest(report({ numPassedTests: 0, numFailedTests: 0, testResults: [] }), 0)).toEqual({
      passed: 0,
      failed: 1,
    });
    expect(tallyVitest(absent, 0)).toEqual({ passed: 0, failed: 1 });
  });
});

describe('the count of the browser', () => {
  const stats = { expected: 4, unexpected: 0, flaky: 0, skipped: 0 };

  it('is what the report says', () => {
    expect(tallyPlaywright(report({ stats, errors: [] }), 0)).toEqual({ passed: 4, failed: 0 });
    expect(tallyPlaywright(report({ stats: { ...stats, unexpected: 2 }, errors: [] }), 1)).toEqual({
      passed: 4,
      failed: 2,
    });
  });

  it('has a failure for a fault outside the tests, and for a runner that failed', () => {
    expect(tallyPlaywright(report({ stats, errors: [{ message: 'cannot load' }] }), 1)).toEqual({
      passed: 4,
      failed: 1,
    });
    expect(tallyPlaywright(report({ stats, errors: [] }), 1)).toEqual({ passed: 4, failed: 1 });
  });

  it('has a failure when nothing ran', () => {
    expect(tallyPlaywright(absent, 0)).toEqual({ passed: 0, failed: 1 });
  });
});

describe('the closing count', () => {
  it('adds both runners', () => {
    expect(
      sum([
        { passed: 3, failed: 1 },
        { passed: 4, failed: 0 },
      ]),
    ).toEqual({ passed: 7, failed: 1 });
  });
});
