import { z } from 'zod';
import { MAX_POINTS } from '@/lib/air/fan-curve';
import { between, MAX_AIRFLOW, MAX_PRESSURE, plain } from './parts-schema';

const point = z.strictObject({
  airflow: between('airflow', 0, MAX_AIRFLOW),
  staticPressure: between('pressure', -MAX_PRESSURE, MAX_PRESSURE),
});

const rises = (points: readonly { airflow: number }[]) =>
  points.findIndex(({ airflow }, i) => i > 0 && airflow <= points[i - 1]!.airflow);

/** A fan by its maker's curve and its measured speed over that of the curve. */
export const fan = z
  .strictObject({
    curve: z.array(point).min(2, 'at least two points').max(MAX_POINTS, `at most ${MAX_POINTS} points`),
    speed: plain(0, 1)
      .optional()
      .describe('measured speed over the speed of the curve; the duty cycle of a control is not one'),
  })
  .superRefine(({ curve }, context) => {
    const at = rises(curve);
    if (at > 0)
      context.addIssue({
        code: 'custom',
        path: ['curve', at, 'airflow'],
        message: 'must be more than at the point before',
      });
    if (curve.length >= 2 && curve.every(({ staticPressure }) => staticPressure <= 0))
      context.addIssue({ code: 'custom', path: ['curve'], message: 'gives no pressure anywhere' });
  });
export type FanQuestion = z.infer<typeof fan>;
