import { faceVelocity } from '@/lib/air/enclosure';
import { airflowOf, faceAreaOf } from '@/lib/air/hood-airflow';
import { metres, metresPerSecond } from '@/lib/units/quantity';
import type { Answer } from '@/lib/worksheets/worksheet';
import { contourOf } from './contour';
import { hoodOf } from './hood';
import type { HoodQuestion, HoodResult } from './schema';
import { warningsOf } from './warnings';
import { workingOf } from './working';

/**
 * How much air a hood must draw for a velocity at the source, with the working and what to mind. SI in, SI out.
 * @param question admitted by `hoodAirflowRequest`; sources of the equations stand in lib/air and in the steps
 */
export function solveHoodAirflow(question: HoodQuestion): Answer<HoodResult> {
  const hood = hoodOf(question);
  const distance = metres(question.distance ?? 0);
  const airflow = airflowOf(hood, metresPerSecond(question.velocity), distance);
  return {
    result: {
      airflow,
      faceVelocity: faceVelocity(airflow, faceAreaOf(hood, distance)),
      contour: contourOf(hood, airflow, distance),
    },
    steps: workingOf(hood, question, airflow),
    warnings: warningsOf(hood, question, airflow),
  };
}
