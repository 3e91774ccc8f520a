import { fromUnit, inUnit, unitOf, type System } from '@/lib/units/kinds';
import { figure, show, told } from '@/lib/units/show';
import type { CaptureProps } from './capture-figure';
import { FRAME } from './figure-frame';
import { FigureText } from './figure-text';
import { scalesOf, velocityLine, type Field, type Wrap } from './opening-geometry';

const BASE = FRAME.height - 34;

function wrapOf(hood: CaptureProps['question']['hood']): Wrap {
  if (hood === 'bench-opening') return 'bench';
  return hood.startsWith('flanged') ? 'flange' : 'free';
}

/** The hood from the side: a duct that ends at the axis' zero, with its flange or the bench it lies on. */
function HoodBody({ field }: { field: Field }) {
  const { x, y } = scalesOf(field);
  const [top, bottom, face] = [y(field.half), y(-field.half), x(0)];
  const rim = Math.min(26, (FRAME.height - 60) / 4);
  const flange = field.wrap === 'flange' ? `M${face} ${top - rim}V${top}M${face} ${bottom}V${bottom + rim}` : '';
  const bench = field.wrap === 'bench' ? `M0 ${bottom}H${FRAME.width}` : '';
  return (
    <path
      d={`M0 ${top}H${face}M0 ${bottom}H${face}${flange}${bench}`}
      className="fill-none stroke-ink"
      strokeWidth="3"
      strokeLinecap="square"
    />
  );
}

/** The distances along the axis, in the unit the far end is shown in. */
function Axis({ field, system }: { field: Field; system: System }) {
  const { x } = scalesOf(field);
  const unit = unitOf('length', show('length', field.far, system).unit);
  const scale = x.copy().domain([0, inUnit(field.far, unit)]);
  return (
    <g className="stroke-quiet">
      {scale.ticks(Math.max(1, Math.floor((x(field.far) - x(0)) / 55))).map((tick) => (
        <g key={tick}>
          <path d={`M${x(fromUnit(tick, unit)).toFixed(1)} ${BASE}v5`} strokeWidth="1" />
          <FigureText x={x(fromUnit(tick, unit))} y={BASE + 19} anchor="middle">
            {figure(tick)}
          </FigureText>
        </g>
      ))}
      <FigureText x={FRAME.width - 4} y={BASE + 32} anchor="end">
        {unit.symbol} from the hood
      </FigureText>
    </g>
  );
}

type LineProps = { field: Field; distance: number; label: string; asked: boolean; place: number };

function VelocityLine({ field, distance, label, asked, place }: LineProps) {
  const { x, y } = scalesOf(field);
  const floor = field.wrap === 'bench' ? -field.half : 0;
  return (
    <>
      <path
        d={velocityLine(field, distance)}
        className={`fill-none ${asked ? 'stroke-brass' : 'stroke-quiet'}`}
        strokeWidth={asked ? 2.6 : 1.1}
        strokeDasharray={asked ? undefined : '5 4'}
      />
      <FigureText x={x(distance) + 3} y={y(floor) - 8 - 15 * place} strong={asked}>
        {label}
      </FigureText>
    </>
  );
}

/** An opening or slot: its lines of equal velocity at the distances of the table, the asked one marked. */
export function OpeningDrawing({ question, result, system }: CaptureProps) {
  const { diameter, height = 0, distance = 0 } = question;
  const lines = result.contour.filter((line) => line.distance > 0);
  const drawn = lines.filter((line, i) => line.distance === distance || i % 2 === 1);
  const far = Math.max(...drawn.map((line) => line.distance)) * 1.1;
  const field: Field = { half: (diameter ?? height) / 2, far, wrap: wrapOf(question.hood) };
  const { x, y } = scalesOf(field);
  const floor = field.wrap === 'bench' ? -field.half : 0;
  return (
    <>
      <path d={`M${x(0)} ${y(floor)}H${FRAME.width}`} className="stroke-rule" strokeWidth="1" />
      {drawn.map((line, i) => (
        <VelocityLine
          key={line.distance}
          {...{ field, distance: line.distance, asked: line.distance === distance, place: i % 2 }}
          label={told('velocity', line.velocity, system)}
        />
      ))}
      <HoodBody field={field} />
      <circle cx={x(distance)} cy={y(floor)} r="5" className="fill-brass stroke-surface" strokeWidth="1.5" />
      <Axis field={field} system={system} />
    </>
  );
}
