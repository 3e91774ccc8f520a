import { flueDraught } from '@/lib/air/stack-effect';
import { VENT_KINDS } from '@/lib/air/vent-limits';
import { celsius, metres } from '@/lib/units/quantity';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

/** How far below outdoors a room without a flue may be before its doors are hard to open, Pa: common practice, no source. */
export const COMFORT_LIMIT = -5;
/** A flue that pulls less than this, Pa, is helped by no opening: less than a draught gauge shows. Common practice, no source. */
export const FAINT = 0.1;

/**
 * Whether the pull of the room beats each appliance's flue or its limit, with every exhaust on: that is the worst case. The draught
 * keeps its sign: a flue colder than the air outdoors pulls down, and then a room at the pressure of outdoors beats it.
 */
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
    const beaten = pulls && draught !== null && draught < -pressure;
    const beyondLimit = pressure < limit;
    return { name, limit, draught, spills: beyondLimit || beaten, beyondLimit };
  });
}

/**
 * The pressure that the room is to be held at, Pa: the strictest of the limits of its appliances, of what the flue of each of them
 * pulls where that is less, and of its doors.
 */
export function heldAt(question: RoomBalanceQuestion): number {
  const flues = fluesOf(question, 0).flatMap(({ limit, draught }, i) => {
    const { pulls } = VENT_KINDS[question.appliances![i]!.vent];
    return pulls && draught !== null && draught >= FAINT ? [limit, -draught] : [limit];
  });
  return Math.max(COMFORT_LIMIT, ...flues);
}
