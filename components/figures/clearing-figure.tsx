import { curveMonotoneX, line } from 'd3-shape';
import { figure } from '@/lib/units/show';
import type { ClearingTimeResult } from '@/lib/worksheets/clearing-time/schema';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';
import { Plot, scalesOf, type Scale } from './plot';

type Props = { result: ClearingTimeResult };
type Point = ClearingTimeResult['curve'][number];
const minutes = (seconds: number) => seconds / 60;
const EVERY = 6;

function textOf({ time, perfectMixing, peak }: ClearingTimeResult): string {
  const rose = peak === undefined ? '' : `When the source stops the room holds ${figure(peak)} mg/m³. `;
  if (time === 0) return `${rose}That is no more than the concentration asked for.`;
  return `${rose}It is clear after ${figure(minutes(time))} minutes; with perfect mixing after ${figure(minutes(perfectMixing))}.`;
}

/** Every sixth point, as it stands in the drawing. */
function rowsOf({ buildUp = [], curve, curvePerfect }: ClearingTimeResult): string[][] {
  const shown = (_: Point, i: number) => i % EVERY === 0;
  const told = ({ time, fraction }: Point) => [figure(minutes(time)), figure(100 * fraction)];
  return [
    ...buildUp.filter((point, i) => shown(point, i) && point.time < 0).map((point) => [...told(point), '']),
    ...curve.filter(shown).map((point, i) => [...told(point), figure(100 * curvePerfect[EVERY * i]!.fraction)]),
  ];
}

type MarkProps = { at: number; scales: { x: Scale; y: Scale }; children: string };

/** The time that was asked for, its words on the side where there is room. */
function ClearMark({ at, scales: { x, y }, children }: MarkProps) {
  const [left, right] = x.range() as [number, number];
  const isLate = x(at) > (left + right) / 2;
  return (
    <>
      <path d={`M${x(at).toFixed(1)} ${y(0)}V${y(100)}`} className="stroke-brass" strokeWidth="2" />
      <FigureText x={x(at) + (isLate ? -6 : 6)} y={40} anchor={isLate ? 'end' : 'start'} strong>
        {children}
      </FigureText>
    </>
  );
}

/** What is in the room by time, as it mixes and as it would with perfect mixing; first how it rose, where a source ran. */
export function ClearingFigure({ result }: Props) {
  const { buildUp, curve, curvePerfect, time } = result;
  const { x, y } = scalesOf(minutes(curve.at(-1)!.time), 100);
  if (buildUp) x.domain([minutes(buildUp[0]!.time), x.domain()[1]!]);
  const drawn = line<Point>(
    (point) => x(minutes(point.time)),
    (point) => y(100 * point.fraction),
  ).curve(curveMonotoneX);
  return (
    <FigureFrame
      title="What is left in the room, by time"
      text={textOf(result)}
      note={`The full line is with the mixing asked for, the broken one with perfect mixing${buildUp ? '; before 0 the source runs' : ''}.`}
      below={
        <NumbersTable
          caption="Share left by time"
          heads={['Minutes', buildUp ? 'Of the highest, %' : 'Left, %', 'With perfect mixing, %']}
          rows={rowsOf(result)}
        />
      }
    >
      <Plot x={x} y={y} labelX="minutes" labelY={buildUp ? 'of the highest, %' : 'left, %'}>
        {buildUp && (
          <>
            <path d={`M${x(0).toFixed(1)} ${y(0)}V${y(100)}`} className="stroke-quiet" strokeWidth="1" />
            <path d={drawn(buildUp) ?? ''} className="fill-none stroke-ink" strokeWidth="2.5" />
          </>
        )}
        <path d={drawn(curvePerfect) ?? ''} className="fill-none stroke-quiet" strokeWidth="2" strokeDasharray="7 5" />
        <path d={drawn(curve) ?? ''} className="fill-none stroke-ink" strokeWidth="2.5" />
        {time > 0 && <ClearMark at={minutes(time)} scales={{ x, y }}>{`${figure(minutes(time))} min`}</ClearMark>}
      </Plot>
    </FigureFrame>
  );
}
