import type { System } from '@/lib/units/kinds';
import { told } from '@/lib/units/show';
import type { RoomBalanceResult } from '@/lib/worksheets/room-balance/schema';
import { FigureFrame } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';

type Props = { result: RoomBalanceResult; system: System };
type Flow = { label: string; airflow: number };

const [LEFT, RIGHT, TOP, FLOOR] = [150, 290, 54, 240];
/** As many as fit beside a wall, and under the ceiling; the table has them all. */
const MOST_FLOWS = 5;
const MOST_FLUES = 3;
/** The widest band, and the least that is still seen. */
const [WIDEST, HAIR] = [26, 1];

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
      <g key={i}>
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

type Appliance = RoomBalanceResult['appliances'][number];

/** An appliance and its flue: the gas rises in it, or comes down and turns into the room. */
function Flue({ spills, i }: { spills: boolean; i: number }) {
  const x = 196 + i * 34;
  return (
    <g>
      <path d={`M${x} ${FLOOR}v-26h22v26z`} className="fill-rule stroke-ink" strokeWidth="1.5" />
      <path d={`M${x + 7} 200V34M${x + 15} 200V34`} className="stroke-ink" strokeWidth="1.5" />
      <path
        d={
          spills
            ? `M${x + 11} 44V190Q${x + 11} 206 ${x - 4} 206M${x + 2} 200L${x - 6} 206L${x + 2} 212`
            : `M${x + 11} 200V42M${x + 5} 54L${x + 11} 40L${x + 17} 54`
        }
        className={`fill-none ${spills ? 'stroke-kiln' : 'stroke-ink'}`}
        strokeWidth={spills ? 4 : 2}
        data-flue={spills ? 'turned' : 'draws'}
      />
    </g>
  );
}

const flueWords = ({ spills }: Appliance) =>
  spills ? 'turns: its gas comes into the room' : 'still draws by this sum';

/** The flows that are drawn: where there are too many, the smaller ones stand together as one. */
function drawnOf(all: readonly Flow[]): Flow[] {
  if (all.length <= MOST_FLOWS) return all.map(({ label, airflow }) => ({ label: label.slice(0, 18), airflow }));
  const sorted = [...all].sort((one, other) => Math.abs(other.airflow) - Math.abs(one.airflow));
  const [kept, rest] = [sorted.slice(0, MOST_FLOWS - 1), sorted.slice(MOST_FLOWS - 1)];
  const others = { label: `${rest.length} others`, airflow: rest.reduce((sum, { airflow }) => sum + airflow, 0) };
  return [...drawnOf(kept), others];
}

function textOf({ result, system }: Props): string {
  const { roomPressure, exhausts, makeUp, appliances } = result;
  const leaves = exhausts.reduce((sum, { airflow }) => sum + airflow, 0);
  const side = roomPressure < 0 ? 'below' : 'above';
  const flues = appliances.map((each) => `the flue of the ${each.name} ${flueWords(each)}`);
  return [
    `${told('airflow', leaves, system)} leave and ${told('airflow', makeUp.total, system)} are let in; the room is ${told('pressure', Math.abs(roomPressure), system)} ${side} outdoors.`,
    flues.length > 0 ? `With everything on, ${flues.join('; ')}.` : '',
  ]
    .filter(Boolean)
    .join(' ');
}

/** The room with its air in and out as bands as wide as their flow, and the flues, turned where they spill. */
export function RoomFigure({ result, system }: Props) {
  const ways: Flow[] = (['supply', 'openings', 'leakage'] as const)
    .map((label) => ({ label: label === 'leakage' ? 'cracks' : label, airflow: result.makeUp[label] }))
    .filter(({ airflow }) => Math.abs(airflow) > 1e-9);
  const outs = drawnOf(result.exhausts.map(({ name, airflow }) => ({ label: name, airflow })));
  const flues = [...result.appliances].sort((one, other) => Number(other.spills) - Number(one.spills));
  const most = Math.max(1e-9, ...[...ways, ...outs].map(({ airflow }) => Math.abs(airflow)));
  const width = (airflow: number) => Math.max(HAIR, (WIDEST * airflow) / most);
  const rows = [
    ...ways.map(({ label, airflow }) => [`in: ${label}`, told('airflow', airflow, system)]),
    ...result.exhausts.map(({ name, airflow }) => [`out: ${name}`, told('airflow', airflow, system)]),
    ...result.appliances.map((each) => [`flue: ${each.name}`, flueWords(each)]),
  ];
  return (
    <FigureFrame
      title="Air in and out of the room"
      text={textOf({ result, system })}
      note="The room is not to scale. A band is as wide as the air it carries; a flue whose heavy arrow comes down and turns into the room is beaten."
      below={
        <NumbersTable
          caption="Air in and out"
          heads={['Way', result.appliances.length > 0 ? 'Airflow, or what the flue does' : 'Airflow']}
          rows={rows}
        />
      }
    >
      <path d={`M${LEFT} ${FLOOR}V${TOP}H${RIGHT}V${FLOOR}Z`} className="fill-none stroke-ink" strokeWidth="3" />
      <Flows flows={ways} wall={LEFT} width={width} system={system} />
      <Flows flows={outs} wall={RIGHT} width={width} system={system} />
      {flues.slice(0, MOST_FLUES).map(({ spills }, i) => (
        <Flue key={i} {...{ spills, i }} />
      ))}
      <FigureText x={220} y={270} anchor="middle" strong>
        {`${told('pressure', result.roomPressure, system)} against outdoors`}
      </FigureText>
    </FigureFrame>
  );
}
