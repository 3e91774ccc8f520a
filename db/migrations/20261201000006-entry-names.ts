import type { Knex } from 'knex';

/** Projection: every name a published entry goes by. */
export const up = (knex: Knex) =>
  knex.schema.createTable('entry_names', (table) => {
    table.integer('entry_id').unsigned().notNullable().references('entries.id');
    table.integer('position').unsigned().notNullable();
    table.string('role', 20).notNullable();
    table.string('name', 600).notNullable();
    table.primary(['entry_id', 'position']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('entry_names');
