import type { Knex } from 'knex';

/** What was published, word for word: the Markdown is the stored text, everything else follows from it. */
export const up = (knex: Knex) =>
  knex.schema.createTable('revisions', (table) => {
    table.increments('id');
    table.integer('entry_id').unsigned().notNullable().references('entries.id');
    table.integer('number').unsigned().notNullable();
    table.string('title', 120).notNullable();
    table.text('markdown', 'mediumtext').notNullable();
    table.specificType('hash', 'char(64)').notNullable();
    table.integer('author_id').unsigned().notNullable().references('people.id');
    table.integer('reviewer_id').unsigned().nullable().references('people.id');
    table.datetime('published_at', { precision: 3 }).notNullable();
    table.date('review_due').notNullable();
    table.unique(['entry_id', 'number']);
    table.index(['published_at']);
  });

export const down = (knex: Knex) => knex.schema.dropTableIfExists('revisions');
