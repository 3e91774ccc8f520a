import type { Knex } from 'knex';

/** Workshops that members keep: the text of the form as it was left, with a version that grows at every save. */
export const up = (knex: Knex) =>
  knex.schema.createTable('workshop_plans', (table) => {
    table.increments('id');
    table.integer('owner_id').unsigned().notNullable().references('people.id');
    table.string('name', 120).notNullable();
    table.text('document', 'mediumtext').notNullable();
    table.integer('version').unsigned().notNullable().defaultTo(1);
    table.datetime('updated_at', { precision: 3 }).notNullable();
    table.index(['owner_id', 'name']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('workshop_plans');
