import { createConnection } from 'mysql2/promise';
import { buildIndex } from '@/lib/search/build-index';
import { searchLibrary } from '@/lib/search/search-library';
import { generatedDocuments, generatedQuestions } from './generated.mjs';
import { timeRivals } from './timing.mjs';

const TABLE = 'bench_search';
const BATCH = 250;
const COLUMNS = ['title', 'names', 'summary', 'body'];

const rowOf = (document) => [
  document.id,
  document.title,
  [...document.names, ...document.codes].join('\n'),
  document.summary,
  [...document.everyday, ...document.related, document.text].join('\n'),
];

async function fill(connection, documents) {
  await connection.query(`drop table if exists ${TABLE}`);
  await connection.query(
    `create table ${TABLE} (id varchar(80) primary key, title varchar(200), names text, summary text, body mediumtext) engine=innodb`,
  );
  for (let from = 0; from < documents.length; from += BATCH)
    await connection.query(`insert into ${TABLE} (id, ${COLUMNS}) values ?`, [
      documents.slice(from, from + BATCH).map(rowOf),
    ]);
  await connection.query(`alter table ${TABLE} add fulltext (${COLUMNS})`);
}

const MATCH = `match (${COLUMNS}) against (? in natural language mode)`;
const QUERY = `select id, ${MATCH} as score from ${TABLE} where ${MATCH} order by score desc limit 20`;

/**
 * Median milliseconds a question at each size, of this search and of MariaDB full text over the same documents, the round trip to
 * the database counted, for a page would make it too. Uses one table of its own and drops it.
 */
export async function databaseSearch(url, sizes, rounds = 2) {
  const connection = await createConnection(url);
  const rows = [];
  try {
    for (const size of sizes) {
      const documents = generatedDocuments(size);
      const questions = generatedQuestions(documents, 60);
      await fill(connection, documents);
      const index = await buildIndex(documents);
      const rivals = {
        ours: (q) => searchLibrary(index, { q }),
        database: (q) => connection.query(QUERY, [q, q]),
      };
      const times = await timeRivals(rivals, questions, rounds);
      rows.push({ size, ...times, ratio: times.ours / times.database });
    }
  } finally {
    await connection.query(`drop table if exists ${TABLE}`);
    await connection.end();
  }
  return rows;
}
