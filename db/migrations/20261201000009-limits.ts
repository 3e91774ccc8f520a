import type { Knex } from 'knex';

/** Projection: exposure limits of published substances, superseded ones kept. */
export const up = (knex: Knex) =>
  knex.schema.createTable('limits', (table) => {
    table.integer('entry_id').unsigned().notNullable().references('entries.id');
    table.integer('position').unsigned().notNullable();
    table.string('authority', 20).notNullable();
    table.string('basis', 20).notNullable();
    table.double('value').notNullable();
    table.string('unit', 20).notNullable();
    table.string('source', 60).notNullable();
    table.string('provenance', 30).notNullable();
    table.string('superseded_by', 600).nullable();
    table.primary(['entry_id', 'position']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('limits');
