import { curveMonotoneX, line } from 'd3-shape';
import { inUnit, TYPED_UNITS, unitOf, type System } from '@/lib/units/kinds';
import { show, told } from '@/lib/units/show';
import type { FanDutyResult } from '@/lib/worksheets/fan-duty/schema';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';
import { Plot, scalesOf } from './plot';

type At = { airflow: number; staticPressure: number };
type Props = { result: FanDutyResult; system: System };

function textOf({ result: { airflow, staticPressure, loadedFilter }, system }: Props): string {
  const meets = `Fan and system meet at ${told('airflow', airflow, system)} and ${told('pressure', staticPressure, system)}.`;
  if (!loadedFilter) return meets;
  return `${meets} With the filter loaded they meet at ${told('airflow', loadedFilter.airflow, system)}.`;
}

/** The fan’s curve over its system’s, the point where they meet, and where it moves to as the filter loads. */
export function DutyFigure({ result, system }: Props) {
  const { curves, airflow, staticPressure, loadedFilter } = result;
  const [flow, pressure] = [
    unitOf('airflow', TYPED_UNITS.airflow[system]),
    unitOf('pressure', TYPED_UNITS.pressure[system]),
  ];
  const mostY = Math.max(...curves.fan.map((each) => each.staticPressure), staticPressure) * 1.1;
  const { x, y } = scalesOf(inUnit(curves.fan.at(-1)!.airflow, flow), inUnit(mostY, pressure));
  const at = (each: At): [number, number] => [x(inUnit(each.airflow, flow)), y(inUnit(each.staticPressure, pressure))];
  const drawn = (points: readonly At[]) => {
    const inside = points.filter((each) => each.staticPressure <= mostY && each.staticPressure >= -0.05 * mostY);
    return (
      line<At>(
        (each) => at(each)[0],
        (each) => at(each)[1],
      ).curve(curveMonotoneX)(inside) ?? ''
    );
  };
  const [px, py] = at({ airflow, staticPressure });
  return (
    <FigureFrame
      title="Fan curve and system curve"
      text={textOf({ result, system })}
      note="The full line is the fan, the broken one its system; the dot is where they meet, the ring where a loaded filter moves it."
      below={
        <NumbersTable
          caption="Pressure of the fan and of its system by airflow"
          heads={[`Airflow, ${flow.symbol}`, `Fan, ${pressure.symbol}`, `System, ${pressure.symbol}`]}
          rows={curves.fan
            .filter((_, i) => i % 4 === 0)
            .map((each, i) => [
              show('airflow', each.airflow, system).text,
              show('pressure', each.staticPressure, system).text,
              show('pressure', curves.system[4 * i]!.staticPressure, system).text,
            ])}
        />
      }
    >
      <Plot x={x} y={y} labelX={`airflow, ${flow.symbol}`} labelY={`static pressure, ${pressure.symbol}`}>
        <path d={drawn(curves.fan)} className="fill-none stroke-ink" strokeWidth="2.5" />
        <path d={drawn(curves.system)} className="fill-none stroke-ink" strokeWidth="2" strokeDasharray="7 5" />
        {loadedFilter && (
          <circle
            cx={at(loadedFilter)[0]}
            cy={at(loadedFilter)[1]}
            r="7"
            className="fill-none stroke-quiet"
            strokeWidth="2"
          />
        )}
        <circle cx={px} cy={py} r="6" className="fill-brass stroke-ink" strokeWidth="1.5" />
        <FigureText x={Math.min(px + 12, 330)} y={Math.max(py - 10, 34)} strong>
          {told('airflow', airflow, system)}
        </FigureText>
      </Plot>
    </FigureFrame>
  );
}
