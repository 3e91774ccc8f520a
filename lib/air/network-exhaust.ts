import type { CubicMetresPerSecond, Pascals } from '@/lib/units/quantity';
import { solveNetwork, type BranchAnswer, type Network } from './branch-network';
import type { Exhaust } from './exhaust';

/** Several machines on one fan as an exhaust of the room they stand in. `branchesAt` how they share it at a room pressure, Pa. */
export type NetworkExhaust = Exhaust & { branchesAt: (roomPressure: number) => BranchAnswer[] };

/**
 * The branches, the common duct and the fan of a network as one exhaust: at each pressure of the room all branches are balanced again,
 * so that room, fan and branches are solved together and not one after another.
 */
export function networkExhaust(name: string, network: Network): NetworkExhaust {
  const at = (pressure: number) =>
    solveNetwork({
      ...network,
      branches: network.branches.map((branch) => ({ ...branch, roomPressure: pressure as Pascals })),
    });
  return {
    ...{ name, wanted: at(0).airflow as CubicMetresPerSecond },
    airflowAt: (pressure) => at(pressure).airflow,
    branchesAt: (pressure) => at(pressure).branches,
    reach: Math.max(network.fan.peak.pressure, network.fan.pressureAt(0)) as Pascals,
  };
}
