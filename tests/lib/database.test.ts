import { beforeEach, describe, expect, it } from 'vitest';
import { type Connection, connection, inTransaction } from '@/lib/database';
import { freshDatabase } from '@/tests/database';

let database: Connection;

beforeEach(async () => {
  database = await freshDatabase();
  await database('people').insert([{ role: 'first' }, { role: 'second' }]);
});

const gate = () => {
  let open = () => {};
  const opened = new Promise<void>((resolve) => (open = resolve));
  return { open, opened };
};

const rename = (on: Connection, from: string, to: string) => on('people').where({ role: from }).update({ role: to });

describe('a transaction', () => {
  it('keeps everything or nothing', async () => {
    const broken = inTransaction(async (transaction) => {
      await transaction('people').insert({ role: 'third' });
      throw new Error('changed my mind');
    });
    await expect(broken).rejects.toThrow('changed my mind');
    expect(await database('people').pluck('role')).toEqual(['first', 'second']);
  });

  it('begins again when a row it read was changed meanwhile, so that no update is lost', async () => {
    const read = gate();
    const changed = gate();
    let runs = 0;
    const slow = inTransaction(async (transaction) => {
      runs += 1;
      const row = await transaction('people').where({ id: 1 }).first('role');
      read.open();
      await changed.opened;
      await transaction('people')
        .where({ id: 1 })
        .update({ role: `${row.role} and slow` });
    });
    await read.opened;
    await database('people').where({ id: 1 }).update({ role: 'quick' });
    changed.open();
    await slow;
    expect(runs).toBe(2);
    expect(await database('people').where({ id: 1 }).pluck('role')).toEqual(['quick and slow']);
  });

  it('begins again when it was the one to give way in a deadlock', async () => {
    const has = { one: gate(), two: gate() };
    let runs = 0;
    const crossing = (mine: 'one' | 'two', other: 'one' | 'two', first: number, second: number) =>
      inTransaction(async (transaction) => {
        runs += 1;
        await transaction('people').where({ id: first }).update({ invented: true });
        has[mine].open();
        await has[other].opened;
        await transaction('people').where({ id: second }).update({ invented: true });
      });
    await Promise.all([crossing('one', 'two', 1, 2), crossing('two', 'one', 2, 1)]);
    expect(runs).toBe(3);
  });

  it('gives up after five tries and says why', async () => {
    let runs = 0;
    const never = inTransaction(async (transaction) => {
      runs += 1;
      await transaction('people').where({ id: 1 }).first();
      await rename(database, runs % 2 ? 'first' : 'other', runs % 2 ? 'other' : 'first');
      await transaction('people').where({ id: 1 }).update({ invented: true });
    });
    await expect(never).rejects.toMatchObject({ errno: 1020 });
    expect(runs).toBe(5);
  });

  it('does not begin again after a fault that would come again', async () => {
    let runs = 0;
    const twice = inTransaction(async (transaction) => {
      runs += 1;
      await transaction('people').insert({ role: 'first' });
    });
    await expect(twice).rejects.toMatchObject({ errno: 1062 });
    expect(runs).toBe(1);
  });

  it('is not tried again when its connection was lost, because it may have been kept', async () => {
    let runs = 0;
    const lost = inTransaction(async (transaction) => {
      runs += 1;
      const [[{ id }]] = await transaction.raw('select connection_id() as id');
      await database.raw('kill ?', [id]);
      await transaction('people').insert({ role: 'third' });
    });
    await expect(lost).rejects.toThrow();
    expect(runs).toBe(1);
  });

  it('takes part in the transaction it is given', async () => {
    const broken = inTransaction(async (outer) => {
      await inTransaction(async (inner) => rename(inner, 'first', 'renamed'), outer);
      throw new Error('changed my mind');
    });
    await expect(broken).rejects.toThrow('changed my mind');
    expect(await database('people').pluck('role')).toEqual(['first', 'second']);
  });
});

describe('a connection', () => {
  it('counts time in UTC, gives a statement five seconds, and sorts as the tables do', async () => {
    const [[settings]] = await connection().raw(
      'select @@time_zone as zone, @@max_statement_time as seconds, @@collation_connection as collation',
    );
    expect(settings).toEqual({ zone: '+00:00', seconds: 5, collation: 'utf8mb4_unicode_ci' });
  });

  it('gives back a moment, a decimal and a large number as they were stored', async () => {
    const at = new Date('2026-07-01T12:34:56.789Z');
    const [[row]] = await connection().raw(
      'select cast(? as datetime(3)) as at, cast(0.1 as decimal(10, 3)) as tenth, 9007199254740993 as large',
      [at],
    );
    expect(row).toEqual({ at, tenth: 0.1, large: '9007199254740993' });
  });
});
