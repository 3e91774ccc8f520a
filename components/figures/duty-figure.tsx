import { curveMonotoneX, line } from 'd3-shape';
import { inUnit, TYPED_UNITS, unitOf, type System } from '@/lib/units/kinds';
import { show, told } from '@/lib/units/show';
import type { FanDutyResult } from '@/lib/worksheets/fan-duty/schema';
import { cutCurve, type At } from './cut-curve';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';
import { Plot, scalesOf } from './plot';

type Props = { result: FanDutyResult; system: System };
/** Every fourth point stands in the table. */
const EVERY = 4;
/** What a number and its unit take up beside the dot. */
const WORDS = 90;

const unitsOf = (system: System) => ({
  flow: unitOf('airflow', TYPED_UNITS.airflow[system]),
  pressure: unitOf('pressure', TYPED_UNITS.pressure[system]),
});

function textOf({ result: { airflow, staticPressure, loadedFilter, crossings }, system }: Props): string {
  const flow = (value: number) => told('airflow', value, system);
  const others = crossings.slice(1).map((each) => flow(each.airflow));
  return [
    `Fan and system meet at ${told('pressure', staticPressure, system)} and ${flow(airflow)}.`,
    others.length > 0 ? `They meet again at ${others.join(' and ')}: the fan may stand at either.` : '',
    loadedFilter ? `With the filter loaded they meet at ${flow(loadedFilter.airflow)}.` : '',
  ]
    .filter(Boolean)
    .join(' ');
}

/** The axes reach as high as the fan does, and below nothing only where the point that was asked for lies there. */
function framed(
  { curves, staticPressure, loadedFilter }: FanDutyResult,
  { flow, pressure }: ReturnType<typeof unitsOf>,
) {
  const points = [staticPressure, loadedFilter?.staticPressure ?? staticPressure];
  const most = Math.max(...curves.fan.map((each) => each.staticPressure), ...points) * 1.1;
  const least = Math.min(0, ...points) * 1.1;
  const { x, y } = scalesOf(
    inUnit(curves.fan.at(-1)!.airflow, flow),
    inUnit(most, pressure),
    least === 0 ? 0 : inUnit(least, pressure),
  );
  const place = (each: At) => ({ cx: x(inUnit(each.airflow, flow)), cy: y(inUnit(each.staticPressure, pressure)) });
  const drawn = line<At>(
    (each) => place(each).cx,
    (each) => place(each).cy,
  ).curve(curveMonotoneX);
  return { x, y, place, drawn: (points: readonly At[] = []) => drawn(cutCurve(points, least, most)) ?? '' };
}

function Numbers({ result: { curves }, system }: Props) {
  const { flow, pressure } = unitsOf(system);
  const all = [curves.fan, curves.system, ...(curves.loaded ? [curves.loaded] : [])];
  return (
    <NumbersTable
      caption="Pressure of the fan and of its system by airflow"
      heads={[
        ...[`Airflow, ${flow.symbol}`, `Fan, ${pressure.symbol}`, `System, ${pressure.symbol}`],
        ...(curves.loaded ? [`Filter loaded, ${pressure.symbol}`] : []),
      ]}
      rows={curves.fan
        .map(({ airflow }, i) => [
          show('airflow', airflow, system).text,
          ...all.map((curve) => show('pressure', curve[i]!.staticPressure, system).text),
        ])
        .filter((_, i) => i % EVERY === 0)}
    />
  );
}

/** The fan’s curve over its system’s, the point where they meet, and where it moves to as the filter loads. */
export function DutyFigure({ result, system }: Props) {
  const { curves, airflow, loadedFilter, crossings } = result;
  const units = unitsOf(system);
  const { x, y, place, drawn } = framed(result, units);
  const point = place(result);
  /** Right of the dot both curves part and leave room for words, unless the frame ends there. */
  const isLate = point.cx > x.range()[1]! - WORDS;
  return (
    <FigureFrame
      title="Fan curve and system curve"
      text={textOf({ result, system })}
      note={`The full line is the fan, the broken one its system; the dot is where they meet${
        curves.loaded ? '. The dotted line is the system with the filter loaded, the ring where the dot moves to' : ''
      }.`}
      below={<Numbers result={result} system={system} />}
    >
      <Plot {...{ x, y }} labelX={`airflow, ${units.flow.symbol}`} labelY={`static pressure, ${units.pressure.symbol}`}>
        <path
          d={drawn(curves.loaded)}
          className="fill-none stroke-quiet"
          strokeWidth="2"
          strokeDasharray="1 5"
          strokeLinecap="round"
        />
        <path d={drawn(curves.fan)} className="fill-none stroke-ink" strokeWidth="2.5" />
        <path d={drawn(curves.system)} className="fill-none stroke-ink" strokeWidth="2" strokeDasharray="7 5" />
        {[...crossings.slice(1), ...(loadedFilter ? [loadedFilter] : [])].map((each, i) => (
          <circle key={i} {...place(each)} r="7" className="fill-none stroke-quiet" strokeWidth="2" />
        ))}
        <circle {...point} r="6" className="fill-brass stroke-ink" strokeWidth="1.5" />
        <FigureText x={point.cx + (isLate ? -14 : 14)} y={point.cy + 5} anchor={isLate ? 'end' : 'start'} strong>
          {told('airflow', airflow, system)}
        </FigureText>
      </Plot>
    </FigureFrame>
  );
}
