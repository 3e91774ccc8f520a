import { inUnit, TYPED_UNITS, unitOf, type System } from '@/lib/units/kinds';
import { show, told } from '@/lib/units/show';
import type { DuctPressureQuestion, DuctPressureResult } from '@/lib/worksheets/duct-pressure/schema';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';
import { Plot, scalesOf } from './plot';

type Props = { question: DuctPressureQuestion; result: DuctPressureResult; system: System };
type Point = { label: string; at: number; lost: number };

/** What has been lost at each place along the duct, from the hood on. */
function pointsOf({ question, result }: Props): Point[] {
  const points: Point[] = [
    { label: 'before the hood', at: 0, lost: 0 },
    { label: 'behind the hood', at: 0, lost: result.hoodStaticPressure },
  ];
  let [at, lost] = [0, result.hoodStaticPressure];
  result.runs.forEach(({ friction, fittings }, i) => {
    at += question.runs[i]?.length ?? 0;
    lost += friction + fittings;
    points.push({ label: `end of run ${i + 1}`, at, lost });
  });
  const rest = result.filter + result.outlet;
  return rest > 0 ? [...points, { label: 'with filter and outlet', at, lost: lost + rest }] : points;
}

function textOf({ result: { staticPressure, hoodStaticPressure, loadedStaticPressure }, system }: Props): string {
  const pressure = (value: number) => told('pressure', value, system);
  const loaded =
    loadedStaticPressure === undefined ? '' : `, and ${pressure(loadedStaticPressure)} with the filter loaded`;
  return `The fan must give ${pressure(staticPressure)}${loaded}; the hood takes ${pressure(hoodStaticPressure)} of it.`;
}

/** How the pressure that the fan must give grows along the duct. */
export function PressureFigure(props: Props) {
  const { result, system } = props;
  const points = pointsOf(props);
  const pressure = unitOf('pressure', TYPED_UNITS.pressure[system]);
  const length = unitOf('length', system === 'si' ? 'm' : 'ft');
  const { x, y } = scalesOf(inUnit(points.at(-1)!.at, length), inUnit(result.staticPressure, pressure) * 1.05);
  const place = ({ at, lost }: Point) => `${x(inUnit(at, length)).toFixed(1)} ${y(inUnit(lost, pressure)).toFixed(1)}`;
  return (
    <FigureFrame
      title="Pressure lost along the duct"
      text={textOf(props)}
      note="From the hood to the end. A step is lost at one place, a slope along a run."
      below={
        <NumbersTable
          caption="Pressure lost from the hood on"
          heads={['Place', `Length, ${length.symbol}`, `Lost, ${pressure.symbol}`]}
          rows={points.map(({ label, at, lost }) => [
            label,
            String(Number(inUnit(at, length).toPrecision(3))),
            show('pressure', lost, system).text,
          ])}
        />
      }
    >
      <Plot x={x} y={y} labelX={`length, ${length.symbol}`} labelY={`pressure lost, ${pressure.symbol}`}>
        <path
          d={`M${points.map(place).join('L')}`}
          className="fill-none stroke-ink"
          strokeWidth="2.5"
          strokeLinejoin="round"
        />
        {points.slice(1).map((point) => (
          <circle
            key={point.label}
            cx={x(inUnit(point.at, length))}
            cy={y(inUnit(point.lost, pressure))}
            r="4"
            className="fill-brass stroke-ink"
          />
        ))}
        <FigureText x={424} y={Math.max(34, y(inUnit(result.staticPressure, pressure)) - 10)} anchor="end" strong>
          {told('pressure', result.staticPressure, system)}
        </FigureText>
      </Plot>
    </FigureFrame>
  );
}
