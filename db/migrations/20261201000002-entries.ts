import type { Knex } from 'knex';

/** An entry's identity; `published` is the number of the revision that readers see, null when none. */
export const up = (knex: Knex) =>
  knex.schema.createTable('entries', (table) => {
    table.increments('id');
    table.string('kind', 20).notNullable();
    table.string('slug', 60).notNullable();
    table.integer('published').unsigned().nullable();
    table.unique(['kind', 'slug']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('entries');
