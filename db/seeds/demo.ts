import type { Knex } from 'knex';

/** The demo scenario: a community workshop that does not exist. Its people are known by their role. */
export const DEMO_WORKSHOP = {
  name: 'Quillon Yard Workshop',
  about: 'A community workshop in a former wheelwright’s yard. It and everything in it are invented.',
};

const ROOMS = [
  { name: 'Plastics room', used_for: 'laser cutter, filament and resin printers, hot wire', volume: 62 },
  { name: 'Wood room', used_for: 'saws, sanders, a spray corner', volume: 118 },
  { name: 'Electronics room', used_for: 'soldering benches, board rework', volume: 44 },
  { name: 'Textiles room', used_for: 'cutting table, heat press, blade cutter', volume: 51 },
];

const PEOPLE = ['editor', 'reviewer', 'instructor', 'keeper of the workshop', 'administrator'];

/** Puts the invented workshop in place; leaves it alone when it is there. */
export async function seedDemo(knex: Knex): Promise<void> {
  for (const role of PEOPLE) await knex('people').insert({ role, invented: true }).onConflict('role').ignore();
  if (await knex('workshops').where({ name: DEMO_WORKSHOP.name }).first('id')) return;
  await knex.transaction(async (transaction) => {
    const [id] = await transaction('workshops').insert({ ...DEMO_WORKSHOP, invented: true });
    await transaction('rooms').insert(ROOMS.map((room, position) => ({ workshop_id: id, position, ...room })));
  });
}
