import type { Knex } from 'knex';

/** Rooms of a workshop: what is done there, and how much air it holds (m3). */
export const up = (knex: Knex) =>
  knex.schema.createTable('rooms', (table) => {
    table.increments('id');
    table.integer('workshop_id').unsigned().notNullable().references('workshops.id');
    table.integer('position').unsigned().notNullable();
    table.string('name', 80).notNullable();
    table.string('used_for', 300).notNullable();
    table.double('volume').notNullable();
    table.unique(['workshop_id', 'position']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('rooms');
