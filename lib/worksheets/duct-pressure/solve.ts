import { systemLoss } from '@/lib/air/duct-system';
import { cubicMetresPerSecond } from '@/lib/units/quantity';
import { airOf, systemOf } from '@/lib/worksheets/duct-system';
import { ductWarnings } from '@/lib/worksheets/duct-warnings';
import { ductSteps } from '@/lib/worksheets/duct-working';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import type { Answer } from '@/lib/worksheets/worksheet';
import type { DuctPressureQuestion, DuctPressureResult } from './schema';

/**
 * What a duct asks of its fan at an airflow: hood, runs in series, filter, outlet. SI in, SI out.
 * @param question admitted by `ductPressureRequest`; sources of the equations stand in lib/air and in the steps
 */
export function solveDuctPressure(question: DuctPressureQuestion): Answer<DuctPressureResult> {
  const [system, air] = [systemOf(question), airOf(question.air)];
  const flow = cubicMetresPerSecond(question.airflow);
  const loss = systemLoss(system, flow, air);
  const loaded = question.filter?.loaded === undefined ? undefined : systemLoss(system, flow, air, true).staticPressure;
  const { staticPressure, fanStaticPressure, hoodStaticPressure, filter, outlet, runs } = loss;
  return {
    result: {
      ...{ staticPressure, fanStaticPressure, hoodStaticPressure, runs, filter, outlet },
      ...(loaded === undefined ? {} : { loadedStaticPressure: loaded }),
    },
    steps: ductSteps(system, loss, flow, air),
    warnings: [...cautionsOf(question.circumstances), ...ductWarnings(system, loss, question.carries)],
  };
}
