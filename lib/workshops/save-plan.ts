import 'server-only';
import type { User } from '@/lib/accounts/user';
import { inTransaction } from '@/lib/database';
import { done, refuse, type Outcome } from '@/lib/outcome';
import { MAX_PLANS, type MemberPlan } from './member-plan';
import { insertPlan, planOfOwner, plansOf, updatePlan } from './store';
import { MAX_DOCUMENT } from './written';

export type SavePlan = { id?: number; version?: number; name: string; document: string };

const none = () => refuse(404, 'No such workshop', 'There is no such workshop of yours.');

function faultOf({ name, document }: SavePlan) {
  const no = (path: string, message: string) =>
    refuse(422, 'Impossible', 'It cannot be kept as it stands.', [{ path, message }]);
  if (name.trim() === '' || name.length > 120) return no('name', 'must be from 1 to 120 characters');
  return document.length > MAX_DOCUMENT ? no('document', `must be at most ${MAX_DOCUMENT} characters`) : undefined;
}

/**
 * Keeps a workshop for a member: a new one without an id, or over the version that was read. When another save was first (another tab,
 * another machine) it is refused with 409 and nothing is lost: the one that is kept comes back by reading it.
 */
export async function savePlan(user: User, plan: SavePlan, at = new Date()): Promise<Outcome<MemberPlan>> {
  const fault = faultOf(plan);
  if (fault) return fault;
  const written = { name: plan.name.trim(), document: plan.document, at };
  return inTransaction(async (transaction) => {
    if (plan.id === undefined) {
      if ((await plansOf(transaction, user.id)).length >= MAX_PLANS)
        return refuse(422, 'Too many', `A member keeps at most ${MAX_PLANS} workshops.`, [
          { path: 'name', message: 'take one away first' },
        ]);
      const id = await insertPlan(transaction, user.id, written);
      return done((await planOfOwner(transaction, user.id, id))!);
    }
    const moved = await updatePlan(transaction, { owner: user.id, id: plan.id, version: plan.version ?? 0 }, written);
    const kept = await planOfOwner(transaction, user.id, plan.id);
    if (!kept) return none();
    return moved
      ? done(kept)
      : refuse(
          409,
          'Changed meanwhile',
          `Somebody has saved version ${kept.version} meanwhile. Both are kept: choose.`,
        );
  });
}
