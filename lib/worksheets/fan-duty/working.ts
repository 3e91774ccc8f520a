import { systemLoss } from '@/lib/air/duct-system';
import { cubicMetresPerSecond } from '@/lib/units/quantity';
import { ductSteps } from '@/lib/worksheets/duct-working';
import { ACGIH, n, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import type { FanDutyQuestion, FanDutyResult } from './schema';
import type { Solved } from './solve';

const STEFFEN = 'Steffen, Astronomy and Astrophysics 239 (1990) 443, through the maker’s points';
const LAWS = 'Fan laws, ASHRAE Systems and Equipment';

/** The working: the fan at this airflow, its system at this airflow, and that the two are equal. */
export function fanDutySteps(question: FanDutyQuestion, solved: Solved, result: FanDutyResult): Step[] {
  const { fan, system, air } = solved;
  const { airflow, staticPressure, branches, speedForAirflow } = result;
  const speed = question.fan.speed ?? 1;
  const given = fan.pressureAt(airflow);
  const laws = speed === 1 ? 'p(Q)' : `s² p(Q/s), s = ${n(speed)}`;
  const flow = cubicMetresPerSecond(airflow);
  return [
    step(
      'Airflow where fan and system meet',
      `${laws} = system(Q)${question.roomPressure ? ' − room pressure' : ''}`,
      airflow,
      'm3/s',
      `${ACGIH}, ch. 6; solved between brackets`,
    ),
    step(
      'Pressure of the fan there',
      `${laws} at Q = ${n(airflow)}`,
      given,
      'Pa',
      speed === 1 ? STEFFEN : `${STEFFEN}; ${LAWS}`,
    ),
    step(
      'Pressure of the system there',
      branches ? 'suction where the branches meet + common duct' : 'hood + duct + filter + outlet − room pressure',
      staticPressure,
      'Pa',
      `${ACGIH}, ch. 5`,
    ),
    ...(typeof speedForAirflow === 'number'
      ? [
          step(
            'Speed for the airflow wanted',
            `s² p(Q/s) = system(Q), Q = ${n(question.targetAirflow!)}`,
            speedForAirflow,
            '',
            LAWS,
          ),
        ]
      : []),
    ...(branches ?? []).map((each) =>
      step(
        `Airflow of ${each.name}`,
        'loss of its hood and duct = suction where they meet + pressure of its room',
        each.airflow,
        'm3/s',
        `${ACGIH}, ch. 5`,
      ),
    ),
    ...(branches ? [] : ductSteps(system, systemLoss(system, flow, air), flow, air)),
  ];
}
