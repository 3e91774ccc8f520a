import { join } from 'node:path';
import { register } from 'tsx/esm/api';
import { command } from './lib/command.mjs';
import { ensureMariadb, openPrivate } from './lib/database.mjs';
import { prepare, requireNode } from './lib/prepare.mjs';
import { DATA } from './lib/root.mjs';
import { steps } from './lib/steps.mjs';

/*
 * `npm run bench`: what is fast, measured against something known, in one run on one machine: the ratios travel, the milliseconds do
 * not. The database is one of its own and is thrown away. With BENCH_BASE_URL=http://127.0.0.1:3000 a running website is measured too.
 */
const SIZES = [100, 1_000, 10_000];
const ms = (/** @type {number} */ value) => `${Number(value.toPrecision(2))} ms`;
const times = (/** @type {number} */ value) => `${Number(value.toPrecision(2))}x`;

async function searchAgainstMiniSearch() {
  const { searchSpeed } = await import('./bench/search-speed.mjs');
  console.log('Search against MiniSearch as it comes, the same generated entries, median a question:');
  for (const { size, ours, plain, ratio, built } of await searchSpeed(SIZES))
    console.log(`  ${size} entries: ${ms(ours)} / ${ms(plain)} = ${times(ratio)}   (built in ${Math.round(built)} ms)`);
}

async function searchAgainstDatabase() {
  const { place } = await prepare(join(DATA, 'bench'), 'npm run bench');
  const step = steps(2);
  await ensureMariadb(place, step);
  const { migrateUrl } = await openPrivate(place, 'fumelore_bench', step, { forTests: true });
  const { databaseSearch } = await import('./bench/database-search.mjs');
  console.log('Search against MariaDB full text, the same generated entries, median a question:');
  for (const { size, ours, database, ratio } of await databaseSearch(migrateUrl, SIZES))
    console.log(`  ${size} entries: ${ms(ours)} / ${ms(database)} = ${times(ratio)}`);
}

async function successOfSearch() {
  const { searchSuccess } = await import('./bench/search-success.mjs');
  console.log('Success on judged questions, real content:');
  for (const { group, name, documents, questions, at1, at3 } of await searchSuccess('tests/data/search-queries.tsv'))
    console.log(
      `  ${name}: first ${at1} %, first three ${at3} %   (${questions} questions, ${group}; ${documents} documents)`,
    );
}

async function airSums() {
  const { airSpeed } = await import('./bench/air-speed.mjs');
  const { rows, ratio } = airSpeed();
  console.log('Sums of air, solves a second, and how the time grows with the size (1 is linear):');
  for (const { name, speed, growth } of rows)
    console.log(`  ${name}: ${Math.round(speed)}   (grows ${Number(growth.toPrecision(2))} for each time larger)`);
  console.log(`  the duct against a plain hand-written loop of the same Colebrook: ${times(ratio)} its time`);
}

async function runningWebsite() {
  const base = process.env.BENCH_BASE_URL;
  if (!base) return console.log('A running website: not measured, BENCH_BASE_URL is not set.');
  const { serverSpeed } = await import('./bench/load.mjs');
  console.log('A running website against its own trivial answers, requests a second:');
  for (const { address, trivial, ours, rival, ratio } of await serverSpeed(base))
    console.log(
      `  ${address}: ${Math.round(ours.perSecond)} (median ${ms(ours.median)}) / ${trivial} ${Math.round(rival.perSecond)} (median ${ms(rival.median)}) = ${times(ratio)} of its time`,
    );
}

await command(async () => {
  requireNode();
  register();
  await searchAgainstMiniSearch();
  await searchAgainstDatabase();
  await successOfSearch();
  await airSums();
  await runningWebsite();
});
