import { airflowThrough } from './airflow-through';
import { branchLossAt, mainLossAt, type Network } from './branch-network';
import { findRisingRoot } from './find-root';

/**
 * What several machines and their common duct together ask of the fan at an airflow, Pa: the suction at which the branches let just that
 * much through, and what the common duct loses. Rises with the airflow, m3/s from 0 up.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 5 (balance at a junction by static pressure).
 * @throws RangeError where the airflow is not finite
 */
export function networkLossAt({ branches, main, air }: Omit<Network, 'fan'>): (airflow: number) => number {
  const losses = branches.map((branch) => branchLossAt(branch, air));
  const mainLoss = mainLossAt(main, air);
  const rooms = branches.map(({ roomPressure = 0 }) => roomPressure);
  const most = Math.max(...rooms.map(Math.abs)) + 1e-9;
  const letsThrough = (suction: number) =>
    losses.reduce((sum, loss, i) => sum + airflowThrough(loss, suction + rooms[i]!), 0);
  return (airflow) => {
    const reach = losses[0]!(airflow) + 2 * most;
    return findRisingRoot((suction) => letsThrough(suction) - airflow, -most, reach) + mainLoss(airflow);
  };
}
