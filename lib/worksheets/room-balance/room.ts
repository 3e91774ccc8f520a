import { airAt, airDensity } from '@/lib/air/air-density';
import { fanExhaust, statedExhaust, type Exhaust } from '@/lib/air/exhaust';
import { leakageOfArea, leakageOfChanges, type Leakage } from '@/lib/air/leakage';
import { networkExhaust } from '@/lib/air/network-exhaust';
import type { Room } from '@/lib/air/room-balance';
import { celsius, cubicMetres, cubicMetresPerSecond, metres, squareMetres } from '@/lib/units/quantity';
import { systemOf } from '@/lib/worksheets/duct-system';
import { fanFrom } from '@/lib/worksheets/fan';
import { branchOf } from '@/lib/worksheets/fan-duty/branches';
import type { RoomBalanceQuestion } from './schema';

type Asked = RoomBalanceQuestion['exhausts'][number];

function exhaustOf(
  { name, airflow = 0, fan, hood, runs, branches = [], ...rest }: Asked,
  { indoor, altitude = 0 }: RoomBalanceQuestion['air'],
): Exhaust {
  if (fan && runs && branches.length > 0) {
    const inRoom = airAt(celsius(indoor), metres(altitude));
    const main = systemOf({ ...rest, hood: { entryLossFactor: 0 }, runs });
    const network = { branches: branches.map((each) => branchOf(each)), main, air: inRoom };
    return networkExhaust(name, { ...network, fan: fanFrom(fan, inRoom.density) });
  }
  if (!fan || !hood || !runs) return statedExhaust(name, cubicMetresPerSecond(airflow));
  const air = airAt(celsius(indoor), metres(altitude));
  return fanExhaust(name, fanFrom(fan, air.density), systemOf({ ...rest, hood, runs }), air);
}

function leakageOf({ makeUp: { leakage }, room }: RoomBalanceQuestion): Leakage | undefined {
  if (!leakage) return undefined;
  return leakage.areaAt4Pa !== undefined
    ? leakageOfArea(squareMetres(leakage.areaAt4Pa))
    : leakageOfChanges(leakage.ach50 ?? 0, cubicMetres(room.volume));
}

/** The room that a question describes, ready to be balanced. */
export function roomOf(question: RoomBalanceQuestion): Room {
  const { air, makeUp, exhausts, room } = question;
  const altitude = metres(air.altitude ?? 0);
  return {
    ...{ indoor: airDensity(celsius(air.indoor), altitude), outdoor: airDensity(celsius(air.outdoor), altitude) },
    exhausts: exhausts.map((each) => exhaustOf(each, air)),
    supply: cubicMetresPerSecond(makeUp.supply ?? 0),
    openings: (makeUp.openings ?? []).map(({ area, dischargeCoefficient, height }) => ({
      ...{ area: squareMetres(area), coefficient: dischargeCoefficient },
      ...(height === undefined ? {} : { height: metres(height) }),
    })),
    leakage: leakageOf(question),
    height: room.height === undefined ? undefined : metres(room.height),
  };
}
