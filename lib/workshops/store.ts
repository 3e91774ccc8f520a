import 'server-only';
import type { Connection } from '@/lib/database';
import type { MemberPlan } from './member-plan';
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

type Row = { id: number; name: string; document: string; version: number; updated_at: Date };
const planOf = ({ updated_at, ...row }: Row): MemberPlan => ({ ...row, updatedAt: updated_at });
const COLUMNS = ['id', 'name', 'document', 'version', 'updated_at'] as const;

/** The workshops of one owner, by name. */
export async function plansOf(connection: Connection, owner: number): Promise<MemberPlan[]> {
  const rows: Row[] = await connection('workshop_plans')
    .where({ owner_id: owner })
    .orderBy(['name', 'id'])
    .select(COLUMNS);
  return rows.map(planOf);
}

/** One workshop of one owner; another's is as if it were not there. */
export async function planOfOwner(connection: Connection, owner: number, id: number): Promise<MemberPlan | undefined> {
  const row: Row | undefined = await connection('workshop_plans').where({ owner_id: owner, id }).first(COLUMNS);
  return row && planOf(row);
}

type Written = { name: string; document: string; at: Date };

export async function insertPlan(connection: Connection, owner: number, { at, ...written }: Written): Promise<number> {
  const [id] = await connection('workshop_plans').insert({ ...written, owner_id: owner, updated_at: at });
  return id!;
}

/** Saves over the version that was read; false when another save was first, or there is no such workshop of this owner. */
export async function updatePlan(
  connection: Connection,
  key: { owner: number; id: number; version: number },
  { at, ...written }: Written,
): Promise<boolean> {
  const { owner, id, version } = key;
  const changed = await connection('workshop_plans')
    .where({ owner_id: owner, id, version })
    .update({ ...written, version: version + 1, updated_at: at });
  return changed === 1;
}

export async function deletePlan(connection: Connection, owner: number, id: number): Promise<boolean> {
  return (await connection('workshop_plans').where({ owner_id: owner, id }).delete()) === 1;
}
