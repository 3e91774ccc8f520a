import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { command } from './lib/command.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { ensureMariadb, openPrivate } from './lib/database.mjs';
import { prepare, requireNode } from './lib/prepare.mjs';
import { TEST_DATA } from './lib/root.mjs';
import { runBrowser, runVitest } from './lib/runners.mjs';
import { steps } from './lib/steps.mjs';
import { sum } from './lib/tally.mjs';
import { ensurePrograms } from './lib/debian.mjs';

/**
 * `npm test`: every test, against a database and a built website of its own, thrown away each time; closes with one line,
 * `N passed, N failed`. With arguments (`npm test -- tests/lib/env.test.ts`) only vitest runs, and takes them.
 */
const args = process.argv.slice(2);
/** What a shell says of an interrupted program: tests that were cut short have not passed. */
const CUT_SHORT = 130;

/** The tests know nothing of the settings a person has for the website. */
function forgetSettings() {
  for (const name of ['DATABASE_URL', 'MIGRATION_DATABASE_URL', 'BASE_URL', 'PORT']) process.env[name] = '';
  Object.assign(process.env, {
    NEXT_DIST_DIR: '.next-test',
    PAGE_CACHE: '',
    FUMELORE_DEMO: 'on',
    LOG_LEVEL: 'info',
    DATABASE_POOL_MAX: '10',
  });
}

await command(
  async () => {
    requireNode();
    forgetSettings();
    const { place } = await prepare(TEST_DATA, 'npm test');
    const all = args.length === 0;
    const step = steps(all ? 8 : 3);
    await ensurePackages(place.log('npm'), step);
    await ensureMariadb(place, step);
    const database = await openPrivate(place, 'fumelore_browser', step, { forTests: true });
    const reports = mkdtempSync(join(tmpdir(), 'fumelore-reports-'));
    process.once('exit', () => rmSync(reports, { recursive: true, force: true }));
    const tallies = [await runVitest(place, database, reports, args)];
    if (all) {
      const doing = (/** @type {string} */ what) => step.doing('browser', what);
      await ensurePrograms('Chromium', ['chromium'], ['chromium'], place.log('apt'), doing);
      step.done('browser', 'ready');
      tallies.push(await runBrowser(place, database, reports, step));
    }
    const { passed, failed } = sum(tallies);
    console.log(`${passed} passed, ${failed} failed`);
    return failed === 0 ? 0 : 1;
  },
  { stopped: CUT_SHORT },
);
