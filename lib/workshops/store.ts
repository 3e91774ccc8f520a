import 'server-only';
import type { Connection } from '@/lib/database';
import type { Room, Workshop } from './workshop';

/** Workshops that were invented for the demo, with their rooms. */
export async function inventedWorkshopsIn(connection: Connection): Promise<Workshop[]> {
  const workshops = await connection('workshops')
    .where({ invented: true })
    .orderBy('name')
    .select('id', 'name', 'about');
  const rooms = await connection('rooms').orderBy('position').select('workshop_id', 'name', 'used_for', 'volume');
  return workshops.map(({ id, name, about }) => ({
    ...{ name, about },
    rooms: rooms
      .filter((room) => room.workshop_id === id)
      .map((room): Room => ({ name: room.name, usedFor: room.used_for, volume: room.volume })),
  }));
}
