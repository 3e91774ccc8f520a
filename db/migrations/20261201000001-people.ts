import type { Knex } from 'knex';

/** People as the library names them: by their role. Invented ones are marked so. */
export const up = (knex: Knex) =>
  knex.schema.createTable('people', (table) => {
    table.increments('id');
    table.string('role', 40).notNullable().unique();
    table.boolean('invented').notNullable().defaultTo(false);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('people');
