import { beforeAll, describe, expect, it } from 'vitest';
import { connection } from '@/lib/database';
import { exampleDocument } from '@/lib/workshops/example';
import { listPlans, readPlan, removePlan } from '@/lib/workshops/list-plans';
import { MAX_PLANS } from '@/lib/workshops/member-plan';
import { savePlan } from '@/lib/workshops/save-plan';
import { MAX_DOCUMENT } from '@/lib/workshops/written';
import { freshDatabase } from '../../database';

let [one, other] = [{ id: 0 }, { id: 0 }];
beforeAll(async () => {
  await freshDatabase();
  const ids = await Promise.all(
    ['one', 'other'].map((role) => connection()('people').insert({ role, invented: true })),
  );
  [one, other] = ids.map(([id]) => ({ id: id! })) as [typeof one, typeof other];
});
const kept = async (name: string, user = one) => {
  const saved = await savePlan(user, { name, document: exampleDocument() });
  if (!saved.ok) throw new Error(saved.detail);
  return saved.value;
};

describe('a member’s workshop', () => {
  it('is kept as it was left, half-done or not, and comes back', async () => {
    const { id } = await kept('Shed');
    expect(await readPlan(one, id)).toMatchObject({
      ok: true,
      value: { name: 'Shed', version: 1, document: exampleDocument() },
    });
    const half = await savePlan(one, {
      id,
      version: 1,
      name: 'Shed',
      document: 'rooms.0.name=half&rooms.0.volume=lots',
    });
    expect(half).toMatchObject({ ok: true, value: { version: 2, document: 'rooms.0.name=half&rooms.0.volume=lots' } });
  });

  it('is not overwritten by a second tab: the later save is told, and what is kept stays', async () => {
    const { id, version } = await kept('Two tabs');
    expect(await savePlan(one, { id, version, name: 'Two tabs', document: 'name=first' })).toMatchObject({ ok: true });
    expect(await savePlan(one, { id, version, name: 'Two tabs', document: 'name=second' })).toMatchObject({
      ok: false,
      status: 409,
    });
    expect(await readPlan(one, id)).toMatchObject({ value: { document: 'name=first', version: 2 } });
  });

  it('is nobody else’s: to read, to save over, or to take away', async () => {
    const { id, version } = await kept('Mine');
    expect(await readPlan(other, id)).toMatchObject({ ok: false, status: 404 });
    expect(await savePlan(other, { id, version, name: 'Mine', document: '' })).toMatchObject({
      ok: false,
      status: 404,
    });
    expect(await removePlan(other, id)).toMatchObject({ ok: false, status: 404 });
    expect((await listPlans(other)).map(({ name }) => name)).not.toContain('Mine');
    expect(await removePlan(one, id)).toMatchObject({ ok: true });
    expect(await readPlan(one, id)).toMatchObject({ ok: false, status: 404 });
  });

  it('is refused beside its field when it is too long, unnamed, or one too many', async () => {
    expect(await savePlan(one, { name: ' ', document: '' })).toMatchObject({
      ok: false,
      status: 422,
      errors: [{ path: 'name' }],
    });
    expect(await savePlan(one, { name: 'Long', document: 'x'.repeat(MAX_DOCUMENT + 1) })).toMatchObject({
      status: 422,
      errors: [{ path: 'document' }],
    });
    for (let i = (await listPlans(other)).length; i < MAX_PLANS; i += 1) await kept(`Shop ${i}`, other);
    expect(await savePlan(other, { name: 'One more', document: '' })).toMatchObject({ ok: false, status: 422 });
  });
});
