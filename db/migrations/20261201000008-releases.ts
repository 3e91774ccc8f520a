import type { Knex } from 'knex';

/** Projection: what each pair releases. */
export const up = (knex: Knex) =>
  knex.schema.createTable('releases', (table) => {
    table.integer('entry_id').unsigned().notNullable().references('entries.id');
    table.string('process', 60).notNullable();
    table.integer('position').unsigned().notNullable();
    table.string('substance', 60).notNullable();
    table.string('form', 20).notNullable();
    table.string('known', 40).notNullable();
    table.primary(['entry_id', 'process', 'position']);
    table.index(['substance']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('releases');
