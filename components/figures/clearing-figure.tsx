import { curveMonotoneX, line } from 'd3-shape';
import { figure } from '@/lib/units/show';
import type { ClearingTimeResult } from '@/lib/worksheets/clearing-time/schema';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';
import { Plot, scalesOf } from './plot';

type Point = ClearingTimeResult['curve'][number];
const minutes = (seconds: number) => seconds / 60;

/** What is left in the room by time, as it mixes and as it would with perfect mixing. */
export function ClearingFigure({
  result: { curve, curvePerfect, time, perfectMixing },
}: {
  result: ClearingTimeResult;
}) {
  const { x, y } = scalesOf(minutes(curve.at(-1)!.time), 100);
  const drawn = line<Point>(
    (point) => x(minutes(point.time)),
    (point) => y(100 * point.fraction),
  ).curve(curveMonotoneX);
  return (
    <FigureFrame
      title="What is left in the room, by time"
      text={`It is clear after ${figure(minutes(time))} minutes; with perfect mixing after ${figure(minutes(perfectMixing))}.`}
      note="The full line is with the mixing asked for, the broken one with perfect mixing."
      below={
        <NumbersTable
          caption="Share left by time"
          heads={['Minutes', 'Left, %', 'Left with perfect mixing, %']}
          rows={curve
            .filter((_, i) => i % 6 === 0)
            .map((point, i) => [
              figure(minutes(point.time)),
              figure(100 * point.fraction),
              figure(100 * curvePerfect[6 * i]!.fraction),
            ])}
        />
      }
    >
      <Plot x={x} y={y} labelX="minutes" labelY="left, %">
        <path d={drawn(curvePerfect) ?? ''} className="fill-none stroke-quiet" strokeWidth="2" strokeDasharray="7 5" />
        <path d={drawn(curve) ?? ''} className="fill-none stroke-ink" strokeWidth="2.5" />
        {time <= curve.at(-1)!.time && (
          <>
            <path d={`M${x(minutes(time)).toFixed(1)} ${y(0)}V${y(100)}`} className="stroke-brass" strokeWidth="2" />
            <FigureText x={x(minutes(time)) - 6} y={40} anchor="end" strong>
              {`${figure(minutes(time))} min`}
            </FigureText>
          </>
        )}
      </Plot>
    </FigureFrame>
  );
}
