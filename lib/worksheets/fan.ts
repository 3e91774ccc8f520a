import { fanOf, type Fan, type FanCurve } from '@/lib/air/fan-curve';
import { ROOM_AIR } from '@/lib/air/air-density';
import { cubicMetresPerSecond, pascals } from '@/lib/units/quantity';
import type { FanQuestion } from './fan-schema';

/** A curve as it is admitted, with its types. */
export const curveOf = (points: FanQuestion['curve']): FanCurve =>
  points.map(({ airflow, staticPressure }) => ({
    ...{ airflow: cubicMetresPerSecond(airflow), staticPressure: pascals(staticPressure) },
  }));

/** The fan of a question in air of a density, kg/m3: curves are printed for that of a room at sea level. */
export const fanFrom = ({ curve, speed = 1 }: FanQuestion, density: number): Fan =>
  fanOf(curveOf(curve), speed, density / ROOM_AIR.density);
