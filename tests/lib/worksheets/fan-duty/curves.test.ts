import { describe, expect, it } from 'vitest';
import { FAN_DUTY_EXAMPLE } from '@/lib/worksheets/fan-duty/example';
import { fanDutyRequest, type FanDutyQuestion } from '@/lib/worksheets/fan-duty/schema';
import { solveFanDuty } from '@/lib/worksheets/fan-duty/solve';

function resultOf(more: Partial<FanDutyQuestion>) {
  const solved = solveFanDuty(fanDutyRequest.parse({ ...FAN_DUTY_EXAMPLE, ...more }));
  if (!solved.ok) throw new Error(solved.detail);
  return solved.value.result;
}

/** A curve between its points, by a straight line. */
function at(curve: { airflow: number; staticPressure: number }[], q: number): number {
  const i = curve.findIndex(({ airflow }) => airflow >= q);
  const [a, b] = [curve[i - 1]!, curve[i]!];
  return a.staticPressure + ((q - a.airflow) / (b.airflow - a.airflow)) * (b.staticPressure - a.staticPressure);
}

describe('the curves of the fan worksheet', () => {
  it('cross where the answer says, and with the filter loaded where that one does', () => {
    const { airflow, staticPressure, loadedFilter, curves } = resultOf({});
    expect(at(curves.fan, airflow) / staticPressure).toBeCloseTo(1, 2);
    expect(at(curves.system, airflow) / staticPressure).toBeCloseTo(1, 2);
    expect(at(curves.loaded!, loadedFilter!.airflow) / loadedFilter!.staticPressure).toBeCloseTo(1, 2);
  });

  it('have none for a loaded filter where there is no filter', () =>
    expect(resultOf({ filter: undefined }).curves.loaded).toBeUndefined());

  it('of several machines cross where they all together do', () => {
    const machine = (name: string, length: number) => ({
      ...{ name, hood: { entryLossFactor: 0.5 } },
      runs: [{ duct: 'galvanised-steel' as const, diameter: 0.1, length }],
    });
    const branches = [machine('saw', 3), machine('lathe', 9), { ...machine('idle', 2), gate: 'shut' as const }];
    const { airflow, staticPressure, curves } = resultOf({ branches, filter: undefined, targetAirflow: undefined });
    expect(at(curves.fan, airflow) / staticPressure).toBeCloseTo(1, 2);
    expect(at(curves.system, airflow) / staticPressure).toBeCloseTo(1, 2);
  });
});
