import type { Knex } from 'knex';

/** Workshops by name; the demo one is marked as invented. */
export const up = (knex: Knex) =>
  knex.schema.createTable('workshops', (table) => {
    table.increments('id');
    table.string('name', 120).notNullable().unique();
    table.string('about', 600).notNullable();
    table.boolean('invented').notNullable().defaultTo(false);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('workshops');
