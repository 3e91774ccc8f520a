import type { Air } from '@/lib/air/air-density';
import type { DuctSystem } from '@/lib/air/duct-system';
import type { Fan } from '@/lib/air/fan-curve';
import { meetingOf, speedFor, type Meeting } from '@/lib/air/operating-point';
import { systemPressure } from '@/lib/air/system-pressure';
import { done, refuse, type Outcome } from '@/lib/outcome';
import { kilogramsPerCubicMetre } from '@/lib/units/quantity';
import { airOf, systemOf } from '@/lib/worksheets/duct-system';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import { fanFrom } from '@/lib/worksheets/fan';
import type { Answer } from '@/lib/worksheets/worksheet';
import { shareOf } from './branches';
import type { FanDutyQuestion, FanDutyResult } from './schema';
import { fanDutyWarnings } from './warnings';
import { fanDutySteps } from './working';

const SHOWN = 40;

export type Solved = { fan: Fan; system: DuctSystem; air: Air; meeting: Meeting; loaded?: Meeting };

const pressureAt = (system: DuctSystem, air: Air, room: number, loaded = false) => {
  const asked = systemPressure(system, air, loaded);
  return (q: number) => asked(q) - room;
};

type Asks = (airflow: number) => number;

/** The fan and what its system asks of it, with a loaded filter too where that is known. */
function curvesOf({ fan, meeting }: Solved, asks: Asks, loaded?: Asks): FanDutyResult['curves'] {
  const end = Math.max(fan.end, (meeting.crossings.at(-1)?.airflow ?? 0) * 1.1);
  const flows = Array.from({ length: SHOWN + 1 }, (_, i) => (end * i) / SHOWN);
  const drawn = (at: (q: number) => number) => flows.map((airflow) => ({ airflow, staticPressure: at(airflow) }));
  return { fan: drawn(fan.pressureAt), system: drawn(asks), ...(loaded && { loaded: drawn(loaded) }) };
}

const refused = () =>
  refuse(422, 'No meeting', 'The fan never meets its system: at no airflow does it give the pressure that is asked.', [
    {
      path: 'fan.curve',
      message: 'never reaches the pressure that hood, duct and room ask for: there is no airflow to answer with',
    },
  ]);

/**
 * Where a fan meets its system, with the speed for a wanted airflow and, for several machines, each one's share. SI in, SI out.
 * @param question admitted by `fanDutyRequest`; refuses (422) where the curves never cross
 */
export function solveFanDuty(question: FanDutyQuestion): Outcome<Answer<FanDutyResult>> {
  const named = airOf(question.air);
  const air = question.density === undefined ? named : { ...named, density: kilogramsPerCubicMetre(question.density) };
  const [fan, system, room] = [fanFrom(question.fan, air.density), systemOf(question), question.roomPressure ?? 0];
  const several = question.branches && question.branches.length > 0;
  const shared = several ? shareOf(question, fan, air) : undefined;
  const asks = shared?.pressureAt ?? pressureAt(system, air, room);
  const meeting = shared
    ? {
        crossings: [shared.network],
        beyond: shared.network.airflow > fan.end,
        stall: shared.network.airflow < fan.peak.airflow,
      }
    : meetingOf(fan, asks);
  const [first] = meeting.crossings;
  if (!first) return refused();
  const hasLoaded = question.filter?.loaded !== undefined && !several;
  const asksLoaded = hasLoaded ? pressureAt(system, air, room, true) : undefined;
  const loaded = asksLoaded && meetingOf(fan, asksLoaded);
  const solved: Solved = { fan, system, air, meeting, loaded };
  const { targetAirflow: target } = question;
  const speed =
    target === undefined || several
      ? undefined
      : (speedFor(fanFrom({ ...question.fan, speed: 1 }, air.density), target, asks(target)) ?? null);
  const result: FanDutyResult = {
    ...{ airflow: first.airflow, staticPressure: first.staticPressure },
    ...(speed === undefined ? {} : { speedForAirflow: speed }),
    ...(loaded?.crossings[0] ? { loadedFilter: loaded.crossings[0] } : {}),
    crossings: meeting.crossings.map(({ airflow, staticPressure }) => ({ airflow, staticPressure })),
    curves: curvesOf(solved, asks, asksLoaded),
    ...(shared ? { branches: shared.shares } : {}),
  };
  return done({
    result,
    steps: fanDutySteps(question, solved, result),
    warnings: [...cautionsOf(question.circumstances), ...fanDutyWarnings(question, solved, result)],
  });
}
