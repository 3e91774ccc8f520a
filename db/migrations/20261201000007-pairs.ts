import type { Knex } from 'knex';

/** Projection: what published materials state of a process. */
export const up = (knex: Knex) =>
  knex.schema.createTable('pairs', (table) => {
    table.integer('entry_id').unsigned().notNullable().references('entries.id');
    table.integer('position').unsigned().notNullable();
    table.string('process', 60).notNullable();
    table.string('control', 30).notNullable();
    table.string('reason', 600).notNullable();
    table.string('provenance', 30).notNullable();
    table.primary(['entry_id', 'position']);
    table.unique(['entry_id', 'process']);
    table.index(['process', 'control']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('pairs');
