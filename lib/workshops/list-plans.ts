import 'server-only';
import type { User } from '@/lib/accounts/user';
import { connection } from '@/lib/database';
import { done, refuse, type Outcome } from '@/lib/outcome';
import type { MemberPlan } from './member-plan';
import { deletePlan, planOfOwner, plansOf } from './store';

/** The workshops that a member keeps. */
export const listPlans = (user: User): Promise<MemberPlan[]> => plansOf(connection(), user.id);

const none = () => refuse(404, 'No such workshop', 'There is no such workshop of yours.');

/** One of them; another member’s is as if it were not there. */
export async function readPlan(user: User, id: number): Promise<Outcome<MemberPlan>> {
  const plan = await planOfOwner(connection(), user.id, id);
  return plan ? done(plan) : none();
}

/** Takes one away for good. */
export async function removePlan(user: User, id: number): Promise<Outcome<null>> {
  return (await deletePlan(connection(), user.id, id)) ? done(null) : none();
}
