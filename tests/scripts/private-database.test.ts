import { existsSync, mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createConnection, type RowDataPacket } from 'mysql2/promise';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Child, stop } from '@/scripts/lib/children.mjs';
import { finishMaking, openDataFolder, type Place, secretsOf } from '@/scripts/lib/data-folder.mjs';
import { type Database, openPrivate } from '@/scripts/lib/database.mjs';
import { markChildren, startedFor, stopLeftovers } from '@/scripts/lib/processes.mjs';

/** A path that is long and has a space and a quote in it, as a newcomer's may. */
const base = mkdtempSync(join(tmpdir(), 'private-'));
const folder = join(base, `somebody's workshop ${'long-'.repeat(30)}`, '.data');
const mark = process.env.FUMELORE_RUN ?? '';

let place: Place;
let database: Database;
const said: string[] = [];
const step = { doing: () => undefined, done: (name: string, what: string) => said.push(`${name}: ${what}`) };

const open = async () => (database = await openPrivate(place, 'fumelore', step));

async function ask(url: string, sql: string): Promise<RowDataPacket[]> {
  const connection = await createConnection(url);
  try {
    const [rows] = await connection.query<RowDataPacket[]>(sql);
    return rows;
  } finally {
    await connection.end();
  }
}

beforeAll(async () => {
  markChildren(folder);
  place = openDataFolder(folder);
  await open();
  await ask(database.migrateUrl, 'create table notes (id int primary key, text varchar(20))');
});

afterAll(async () => {
  await stopLeftovers(folder);
  rmSync(base, { recursive: true });
  process.env.FUMELORE_RUN = mark;
});

describe('the private database', () => {
  it('keeps every commit, notices lost updates, and compares text in one way', async () => {
    const names = `@@bind_address as bind_address, @@skip_name_resolve as skip_name_resolve, @@local_infile as local_infile,
      @@innodb_flush_log_at_trx_commit as flush_log, @@innodb_doublewrite as doublewrite, @@sync_binlog as sync_binlog,
      @@log_bin as log_bin, @@binlog_format as binlog_format, @@innodb_snapshot_isolation as snapshot_isolation,
      @@global.innodb_lock_wait_timeout as lock_wait, @@innodb_rollback_on_timeout as rollback_on_timeout,
      @@innodb_print_all_deadlocks as print_deadlocks, @@character_set_server as charset, @@collation_server as collation,
      @@global.max_allowed_packet as packet, @@global.tx_isolation as isolation`;
    expect((await ask(database.url, `select ${names}`))[0]).toEqual({
      bind_address: '127.0.0.1',
      skip_name_resolve: 1,
      local_infile: 0,
      flush_log: 1,
      doublewrite: 1,
      sync_binlog: 1,
      log_bin: 1,
      binlog_format: 'ROW',
      snapshot_isolation: 1,
      lock_wait: 5,
      rollback_on_timeout: 1,
      print_deadlocks: 1,
      charset: 'utf8mb4',
      collation: 'utf8mb4_unicode_ci',
      packet: 64 * 1024 * 1024,
      isolation: 'REPEATABLE-READ',
    });
  });

  it.each([
    ['create table more (id int)', 1142],
    ['drop table notes', 1142],
    ["select * from notes into outfile '/tmp/notes'", 1227],
    ['set global max_connections = 10', 1227],
    ['select * from mysql.global_priv', 1142],
    ['create database other', 1044],
  ])('refuses the program: %s', async (sql, errno) => {
    await expect(ask(database.url, sql)).rejects.toMatchObject({ errno });
  });

  it.each([
    ['create database other', 1044],
    ["create user 'somebody'@'127.0.0.1'", 1227],
    ["select * from notes into outfile '/tmp/notes'", 1227],
    ['grant select on fumelore.* to fumelore_app@127.0.0.1', 1044],
  ])('refuses the account that changes tables: %s', async (sql, errno) => {
    await expect(ask(database.migrateUrl, sql)).rejects.toMatchObject({ errno });
  });

  it.each(['root', 'root:', 'fumelore_app', 'fumelore_app:wrong', 'fumelore_test', ''])(
    'turns %j away',
    async (who) => {
      const { host } = new URL(database.url);
      await expect(ask(`mysql://${who}@${host}/`, 'select 1')).rejects.toMatchObject({ errno: 1045 });
    },
  );

  it('is for this user alone, and leaves no password lying about', () => {
    const modes = [place.folder, place.database, place.secrets].map((path) => statSync(path).mode & 0o777);
    expect(modes).toEqual([0o700, 0o700, 0o600]);
    expect(existsSync(join(place.folder, 'accounts.sql'))).toBe(false);
    expect(new Set(Object.values(secretsOf(place))).size).toBe(4);
  });

  it('has lost nothing after it was killed, and is found and stopped when it was left behind', async () => {
    finishMaking(place);
    await ask(database.url, "insert into notes values (1, 'kept')");
    for (const { pid } of startedFor(folder)) process.kill(pid, 'SIGKILL');
    await (database.child as Child).done;
    await open();
    expect(await ask(database.url, 'select text from notes')).toEqual([{ text: 'kept' }]);
    expect(startedFor(folder)).toEqual([{ pid: database.child?.pid, name: 'mariadbd' }]);
    expect(await stopLeftovers(folder)).toBe(1);
    await database.child?.done;
  });

  it('has new passwords when the old ones were lost', async () => {
    const before = database.url;
    rmSync(place.secrets);
    await open();
    expect(await ask(database.url, 'select text from notes')).toEqual([{ text: 'kept' }]);
    await expect(ask(before.replace(/:\d+\//, `:${new URL(database.url).port}/`), 'select 1')).rejects.toMatchObject({
      errno: 1045,
    });
    await stop(database.child as Child);
    expect(startedFor(folder)).toEqual([]);
  });

  it('is made anew only when its first making never came to its end', async () => {
    await open();
    expect(await ask(database.url, 'select count(*) as count from notes')).toEqual([{ count: 1 }]);
    await stop(database.child as Child);
    writeFileSync(place.unfinished, '');
    await open();
    expect(said.at(-1)).toMatch(/^database: made anew, because the first making never came to its end/);
    expect(await ask(database.migrateUrl, "show tables like 'notes'")).toEqual([]);
    finishMaking(place);
    await stop(database.child as Child);
  });

  it('is left as it is when it is not whole', async () => {
    rmSync(join(place.database, 'ibdata1'));
    await expect(open()).rejects.toThrow('is not a whole database');
    expect(existsSync(join(place.database, 'mysql'))).toBe(true);
  });
});
