import { existsSync, readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number }} Tally */

/** A runner that broke off, ran nothing, or says that it failed where none of its tests did, is itself one failure. */
function honest({ passed, failed }, code) {
  const broken = passed + failed === 0 || (code !== 0 && failed === 0);
  return { passed, failed: failed + (broken ? 1 : 0) };
}

/** @param {string} file @returns {any} */
const read = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : {});

/** What vitest's JSON report counts; a file that could not be loaded is one failure. @param {string} file @param {number} code */
export function tallyVitest(file, code) {
  const { numPassedTests = 0, numFailedTests = 0, testResults = [] } = read(file);
  const unloaded = testResults.filter(
    (/** @type {any} */ one) =>
      one.status === 'failed' && !one.assertionResults.some((/** @type {any} */ test) => test.status === 'failed'),
  );
  return honest({ passed: numPassedTests, failed: numFailedTests + unloaded.length }, code);
}

/** What Playwright's JSON report counts; an error outside any test is one failure. @param {string} file @param {number} code */
export function tallyPlaywright(file, code) {
  const { stats = { expected: 0, unexpected: 0, flaky: 0 }, errors = [] } = read(file);
  return honest({ passed: stats.expected, failed: stats.unexpected + stats.flaky + errors.length }, code);
}

/** @param {Tally[]} tallies @returns {Tally} */
export const sum = (tallies) =>
  tallies.reduce((all, one) => ({ passed: all.passed + one.passed, failed: all.failed + one.failed }), {
    passed: 0,
    failed: 0,
  });
