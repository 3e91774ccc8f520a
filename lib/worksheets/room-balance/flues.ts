import { flueDraught } from '@/lib/air/stack-effect';
import { VENT_KINDS } from '@/lib/air/vent-limits';
import { celsius, metres } from '@/lib/units/quantity';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

/** Whether the pull of the room beats each appliance's flue or its limit, with every exhaust on: that is the worst case. */
export function fluesOf(
  { appliances = [], air }: RoomBalanceQuestion,
  pressure: number,
): RoomBalanceResult['appliances'] {
  return appliances.map(({ name, vent, flueHeight, flueTemperature = air.indoor }) => {
    const { limit, pulls } = VENT_KINDS[vent];
    const draught =
      flueHeight === undefined
        ? null
        : flueDraught(metres(flueHeight), celsius(flueTemperature), celsius(air.outdoor), metres(air.altitude ?? 0));
    const beaten = pulls && draught !== null && -pressure > Math.max(0, draught);
    return { name, limit, draught, spills: pressure < limit || beaten };
  });
}
