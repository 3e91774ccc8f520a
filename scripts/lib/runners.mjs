import { join } from 'node:path';
import { ensureBuild } from './build.mjs';
import { run } from './children.mjs';
import { migrate, takeUpLibrary } from './jobs.mjs';
import { freePort } from './ports.mjs';
import { tallyPlaywright, tallyVitest } from './tally.mjs';
import { lineFor, Stopped } from './trouble.mjs';
import { startWebsite } from './website.mjs';

/**
 * @typedef {import('./data-folder.mjs').Place} Place
 * @typedef {import('./database.mjs').Database} Database
 * @typedef {import('./tally.mjs').Tally} Tally
 */

/** Runs vitest. @param {Place} place @param {Database} database @param {string} reports @param {string[]} args @returns {Promise<Tally>} */
export async function runVitest(place, database, reports, args) {
  const file = join(reports, 'vitest.json');
  const how = ['--reporter=default', '--reporter=json', `--outputFile=${file}`];
  const { code } = await run('vitest', process.execPath, ['node_modules/vitest/vitest.mjs', 'run', ...how, ...args], {
    log: place.log('vitest'),
    env: { TEST_DATABASE_URL: database.testUrl, NEXT_DIST_DIR: undefined },
    out: 'inherit',
  });
  return tallyVitest(file, code);
}

/**
 * Builds and serves the website as a visitor gets it. @param {Place} place @param {Database} database @param {import('./steps.mjs').Steps} step
 * @returns {Promise<string>} its address
 */
async function serveSite(place, database, step) {
  step.done('tables', await migrate(place, database, 'latest'));
  step.done('starter library', await takeUpLibrary(place, database));
  const port = await freePort();
  const site = { port, dist: '.next-test', baseUrl: `http://127.0.0.1:${port}` };
  await ensureBuild(place, database, site, step);
  await startWebsite(place, database, site);
  step.done('website', `ready at ${site.baseUrl}`);
  return site.baseUrl;
}

/**
 * Runs the journeys in a browser against that website; one that cannot be served is a failure, told in one line.
 * @param {Place} place @param {Database} database @param {string} reports @param {import('./steps.mjs').Steps} step @returns {Promise<Tally>}
 */
export async function runBrowser(place, database, reports, step) {
  const file = join(reports, 'browser.json');
  let address;
  try {
    address = await serveSite(place, database, step);
  } catch (error) {
    if (error instanceof Stopped) throw error;
    console.log(lineFor(error));
    return { passed: 0, failed: 1 };
  }
  const { code } = await run('browser', process.execPath, ['node_modules/@playwright/test/cli.js', 'test'], {
    log: place.log('browser'),
    env: { BASE_URL: address, SITE_DATABASE_URL: database.url, PLAYWRIGHT_JSON_OUTPUT_FILE: file },
    out: 'inherit',
  });
  return tallyPlaywright(file, code);
}
