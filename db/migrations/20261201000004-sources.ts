import type { Knex } from 'knex';

/** The shared list of sources, in the order of the list. */
export const up = (knex: Knex) =>
  knex.schema.createTable('sources', (table) => {
    table.string('id', 60).primary();
    table.integer('position').unsigned().notNullable();
    table.string('title', 300).notNullable();
    table.string('publisher', 160).notNullable();
    table.string('year', 30).notNullable();
    table.string('type', 20).notNullable();
    table.string('locator', 200).nullable();
    table.string('url', 300).nullable();
    table.string('seen', 60).notNullable();
    table.string('note', 600).nullable();
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('sources');
