import { scaleSqrt } from 'd3-scale';
import type { System } from '@/lib/units/kinds';
import { told } from '@/lib/units/show';
import type { RoomBalanceResult } from '@/lib/worksheets/room-balance/schema';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';

type Props = { result: RoomBalanceResult; system: System };
type Flow = { label: string; airflow: number };

const [LEFT, RIGHT, TOP, FLOOR] = [150, 290, 54, 240];

/** A band of air through a wall at x, as wide as its flow, pointing the way the air goes. */
function Band({ x, y, width, right }: { x: number; y: number; width: number; right: boolean }) {
  const [half, tip, way] = [width / 2, width / 2 + 5, right ? 1 : -1];
  const [tail, neck, end] = [x - 30 * way, x + 16 * way, x + 30 * way];
  const d = `M${tail} ${y - half}H${neck}V${y - tip}L${end} ${y}L${neck} ${y + tip}V${y + half}H${tail}Z`;
  return <path d={d} className="fill-link" />;
}

type FlowsProps = { flows: Flow[]; wall: number; width: (airflow: number) => number; system: System };

/** The flows through one wall, one below another; forward is to the right: in by the left wall, out by the right one. */
function Flows({ flows, wall, width, system }: FlowsProps) {
  const step = Math.min(60, 176 / Math.max(flows.length, 1));
  const [at, anchor] = wall === LEFT ? ([LEFT - 36, 'end'] as const) : ([RIGHT + 36, 'start'] as const);
  return flows.map(({ label, airflow }, i) => {
    const y = TOP + 24 + i * step;
    return (
      <g key={label}>
        <Band x={wall} y={y} width={width(Math.abs(airflow))} right={airflow >= 0} />
        <FigureText x={at} y={y - 3} anchor={anchor}>
          {label}
        </FigureText>
        <FigureText x={at} y={y + 13} anchor={anchor} strong>
          {told('airflow', airflow, system)}
        </FigureText>
      </g>
    );
  });
}

function Flue({ appliance, i }: { appliance: RoomBalanceResult['appliances'][number]; i: number }) {
  const x = 192 + i * 30;
  return (
    <g>
      <path d={`M${x} 240v-26h22v26z`} className="fill-rule stroke-ink" strokeWidth="1.5" />
      <path d={`M${x + 7} 214V34M${x + 15} 214V34`} className="stroke-ink" strokeWidth="1.5" />
      <path
        d={
          appliance.spills
            ? `M${x + 11} 44V190M${x + 5} 180L${x + 11} 192L${x + 17} 180`
            : `M${x + 11} 200V42M${x + 5} 54L${x + 11} 40L${x + 17} 54`
        }
        className={`fill-none ${appliance.spills ? 'stroke-kiln' : 'stroke-ink'}`}
        strokeWidth={appliance.spills ? 4 : 2}
      />
    </g>
  );
}

function textOf({ result, system }: Props): string {
  const { roomPressure, exhausts, makeUp, appliances } = result;
  const leaves = exhausts.reduce((sum, { airflow }) => sum + airflow, 0);
  const side = roomPressure < 0 ? 'below' : 'above';
  const flues = appliances.map(
    ({ name, spills }) =>
      `the flue of the ${name} ${spills ? 'turns: its gas comes into the room' : 'still draws by this sum'}`,
  );
  return [
    `${told('airflow', leaves, system)} leave and ${told('airflow', makeUp.total, system)} are let in; the room is ${told('pressure', Math.abs(roomPressure), system)} ${side} outdoors.`,
    flues.length > 0 ? `With everything on, ${flues.join('; ')}.` : '',
  ].join(' ');
}

/** The room with its air in and out as bands as wide as their flow, and the flues, turned where they spill. */
export function RoomFigure({ result, system }: Props) {
  const ways: Flow[] = (['supply', 'openings', 'leakage'] as const)
    .map((label) => ({ label: label === 'leakage' ? 'cracks' : label, airflow: result.makeUp[label] }))
    .filter(({ airflow }) => Math.abs(airflow) > 1e-9);
  const outs = result.exhausts.slice(0, 5).map(({ name, airflow }) => ({ label: name.slice(0, 18), airflow }));
  const most = Math.max(1e-9, ...[...ways, ...outs].map(({ airflow }) => Math.abs(airflow)));
  const width = scaleSqrt([0, most], [2, 26]);
  const rows = [
    ...ways.map(({ label, airflow }) => [`in: ${label}`, told('airflow', airflow, system)]),
    ...result.exhausts.map(({ name, airflow }) => [`out: ${name}`, told('airflow', airflow, system)]),
  ];
  return (
    <FigureFrame
      title="Air in and out of the room"
      text={textOf({ result, system })}
      note="Not to scale. A band is the wider the more air it carries; a flue drawn with a heavy arrow down is beaten."
      below={<NumbersTable caption="Air in and out" heads={['Way', 'Airflow']} rows={rows} />}
    >
      <path d={`M${LEFT} ${FLOOR}V${TOP}H${RIGHT}V${FLOOR}Z`} className="fill-none stroke-ink" strokeWidth="3" />
      <Flows flows={ways} wall={LEFT} width={width} system={system} />
      <Flows flows={outs} wall={RIGHT} width={width} system={system} />
      {result.appliances.slice(0, 3).map((appliance, i) => (
        <Flue key={appliance.name} appliance={appliance} i={i} />
      ))}
      <FigureText x={220} y={270} anchor="middle" strong>
        {`${told('pressure', result.roomPressure, system)} against outdoors`}
      </FigureText>
    </FigureFrame>
  );
}
