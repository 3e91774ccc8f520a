import { register } from 'tsx/esm/api';

/*
 * What is fast, measured against something known, in one run on one machine: the ratios travel, the milliseconds do not.
 *   npm run bench                                    search against MiniSearch as it comes, and success on judged questions
 *   DATABASE_URL=… npm run bench                     also against MariaDB full text
 *   BENCH_BASE_URL=http://127.0.0.1:3000 npm run bench   also a running server against its own trivial answers
 */
register();
const { searchSpeed } = await import('./bench/search-speed.mjs');
const { searchSuccess } = await import('./bench/search-success.mjs');
const { databaseSearch } = await import('./bench/database-search.mjs');
const { serverSpeed } = await import('./bench/load.mjs');

const SIZES = [100, 1_000, 10_000];
const { DATABASE_URL, BENCH_BASE_URL } = process.env;
const ms = (value) => `${value.toPrecision(2)} ms`;
const times = (value) => `${value.toPrecision(2)}x`;

console.log('Search against MiniSearch as it comes, the same generated entries, median a question:');
for (const { size, ours, plain, ratio, built } of await searchSpeed(SIZES))
  console.log(
    `  ${size} entries: ${ms(ours)} against ${ms(plain)} = ${times(ratio)}   (built in ${Math.round(built)} ms)`,
  );

console.log('Success on judged questions, real content:');
for (const { name, documents, questions, at1, at3 } of await searchSuccess('tests/data/search-queries.tsv'))
  console.log(`  ${name}: first ${at1} %, first three ${at3} %   (${questions} questions, ${documents} documents)`);

if (DATABASE_URL) {
  console.log('Search against MariaDB full text, the same generated entries, median a question:');
  for (const { size, ours, database, ratio } of await databaseSearch(DATABASE_URL, SIZES))
    console.log(`  ${size} entries: ${ms(ours)} against ${ms(database)} = ${times(ratio)}`);
} else console.log('MariaDB full text: not measured, DATABASE_URL is not set.');

if (BENCH_BASE_URL) {
  console.log('A running server, requests a second:');
  for (const { address, trivial, ours, rival, ratio } of await serverSpeed(BENCH_BASE_URL))
    console.log(
      `  ${address}: ${Math.round(ours.perSecond)} (median ${ms(ours.median)}) against ${trivial} ${Math.round(rival.perSecond)} = ${times(ratio)}`,
    );
} else console.log('A running server: not measured, BENCH_BASE_URL is not set.');
