import type { Metres, MetresPerSecond } from '@/lib/units/quantity';
import type { Air } from './air-density';
import { fromZeroUp } from './domain';

/**
 * Reynolds number of the flow in a round duct: Re = ρ V D / μ, no unit. In standard air 66 400 D V (D in m, V in m/s).
 * Source: ASHRAE Fundamentals (2021), ch. 21, eq. 20 and 21.
 * @throws RangeError for a negative or endless amount
 */
export function reynoldsNumber(velocity: MetresPerSecond, diameter: Metres, air: Air): number {
  fromZeroUp({ velocity, diameter });
  return (air.density * velocity * diameter) / air.viscosity;
}
