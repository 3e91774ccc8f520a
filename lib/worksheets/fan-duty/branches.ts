import type { Air } from '@/lib/air/air-density';
import { balancingLosses, solveNetwork, type Branch } from '@/lib/air/branch-network';
import { networkLossAt } from '@/lib/air/network-loss';
import type { Fan } from '@/lib/air/fan-curve';
import { cubicMetresPerSecond, pascals } from '@/lib/units/quantity';
import { systemOf } from '@/lib/worksheets/duct-system';
import type { FanDutyQuestion, FanDutyResult } from './schema';

export type AskedBranch = NonNullable<FanDutyQuestion['branches']>[number];

/** A branch of the network that a question describes, its room at `room` Pa where it does not say. */
export const branchOf = (
  { name, hood, runs, gate = 'open', leak, wanted, roomPressure }: AskedBranch,
  room = 0,
): Branch => ({
  ...{ name, system: systemOf({ hood, runs }), open: gate === 'open', leak },
  roomPressure: pascals(roomPressure ?? room),
  wanted: wanted === undefined ? undefined : cubicMetresPerSecond(wanted),
});

/** How the machines on one fan share it. The hood of the question is none: its duct is the common one. */
export function shareOf(question: FanDutyQuestion, fan: Fan, air: Air) {
  const branches = (question.branches ?? []).map((each) => branchOf(each, question.roomPressure ?? 0));
  const main = systemOf({ ...question, hood: { entryLossFactor: 0 } });
  const network = solveNetwork({ branches, main, fan, air });
  const balance = new Map(balancingLosses(branches, air).map(({ name, k }) => [name, k]));
  const shares: FanDutyResult['branches'] = network.branches.map(({ name, open, airflow, velocity, wanted }) => ({
    ...{ name, gate: open ? 'open' : 'shut', airflow, velocity },
    ...(wanted === undefined ? {} : { wanted }),
    ...(balance.has(name) ? { balancingLossFactor: balance.get(name)! } : {}),
  }));
  return { network, shares, pressureAt: networkLossAt({ branches, main, air }) };
}
