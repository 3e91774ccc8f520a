import type { Knex } from 'knex';

/** One row: the number that every process watches to learn of a publish. */
export const up = (knex: Knex) =>
  knex.schema.createTable('library_state', (table) => {
    table.specificType('id', 'tinyint unsigned').primary();
    table.integer('version').unsigned().notNullable();
    table.datetime('changed_at', { precision: 3 }).notNullable();
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('library_state');
