import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import createKnex, { type Knex } from 'knex';
import { createConnection, type Connection as Raw, type RowDataPacket } from 'mysql2/promise';
import { afterAll } from 'vitest';
import { knexConfig } from '@/db/connection';
import { type Connection, connection } from '@/lib/database';

/*
 * A database for each worker, so that test files never meet. `freshDatabase()`, in a beforeEach or beforeAll, gives the tables as the
 * migrations leave them, and is what lib/database.ts talks to. Run through `npm test -- tests/…`, which brings the server.
 */
const MIGRATIONS = join(process.cwd(), 'db/migrations');
const NAME = `fumelore_test_${process.env.VITEST_POOL_ID ?? '1'}`;
/** Beside it, the rows that the migrations themselves put in. */
const FIRST = `${NAME}_first`;

function address(database: string): string {
  const server = process.env.TEST_DATABASE_URL;
  if (!server) throw new Error('TEST_DATABASE_URL is not set: run this file by npm test -- and its path');
  return new URL(`/${database}`, server).href;
}

const files = () => readdirSync(MIGRATIONS).sort();

/** One value for the shape that the migrations give: a database of another shape is made anew. */
function shape(): string {
  const hash = createHash('sha256');
  for (const file of files()) hash.update(file).update(readFileSync(join(MIGRATIONS, file)));
  return hash.digest('hex');
}

/** Read as the tests read TypeScript, under the names that the command gives them. */
const migrationSource: Knex.MigrationSource<string> = {
  getMigrations: async () => files(),
  getMigrationName: (file) => file,
  getMigration: (file) => import(`../db/migrations/${file.replace(/\.ts$/, '')}.ts`),
};

async function rowsOf(raw: Raw, sql: string, values: unknown[] = []): Promise<RowDataPacket[]> {
  return (await raw.query<RowDataPacket[]>(sql, values))[0];
}

const tablesIn = async (raw: Raw, database: string): Promise<string[]> =>
  (
    await rowsOf(
      raw,
      `select table_name as name from information_schema.tables
       where table_schema = ? and table_type = 'BASE TABLE' and table_name not like 'knex%'`,
      [database],
    )
  ).map((row) => String(row.name));

const isEmpty = async (raw: Raw, table: string) =>
  (await rowsOf(raw, 'select 1 from ?? limit 1', [table])).length === 0;

async function make(raw: Raw): Promise<void> {
  for (const database of [NAME, FIRST]) {
    await raw.query('drop database if exists ??', [database]);
    await raw.query('create database ?? character set utf8mb4 collate utf8mb4_unicode_ci', [database]);
  }
  const knex = createKnex(knexConfig(address(NAME), { max: 2, statementSeconds: 0 }));
  await knex.migrate.latest({ migrationSource });
  await knex.destroy();
  for (const table of await tablesIn(raw, NAME))
    if (!(await isEmpty(raw, `${NAME}.${table}`)))
      await raw.query('create table ?? as select * from ??', [`${FIRST}.${table}`, `${NAME}.${table}`]);
  await raw.query('create table ?? as select ? as shape', [`${FIRST}.knex_shape`, shape()]);
}

/** Puts back what the migrations left. */
async function empty(raw: Raw): Promise<void> {
  await raw.query('set foreign_key_checks = 0');
  for (const table of await tablesIn(raw, NAME)) await raw.query('truncate table ??', [`${NAME}.${table}`]);
  for (const table of await tablesIn(raw, FIRST))
    await raw.query('insert into ?? select * from ??', [`${NAME}.${table}`, `${FIRST}.${table}`]);
}

let admin: Raw | undefined;

/** One file at a time: the name is held until this file's connections close. */
async function take(): Promise<Raw> {
  const raw = await createConnection(address('information_schema'));
  const [held] = await rowsOf(raw, 'select get_lock(?, 100) as held', [NAME]);
  if (held?.held !== 1) throw new Error(`${NAME} is in use by another test file`);
  const found = await rowsOf(raw, 'select shape from ??', [`${FIRST}.knex_shape`]).catch(() => []);
  if (found[0]?.shape !== shape()) await make(raw);
  return raw;
}

/** The worker's own database, its tables as the migrations leave them. */
export async function freshDatabase(): Promise<Connection> {
  process.env.DATABASE_URL = address(NAME);
  // Vitest sets this one to its own meaning, a path.
  process.env.BASE_URL = 'http://127.0.0.1:3000';
  admin ??= await take();
  await empty(admin);
  return connection();
}

afterAll(async () => {
  if (!admin) return;
  await connection().destroy();
  await admin.end();
});
