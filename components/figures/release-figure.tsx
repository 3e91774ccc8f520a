import { scaleLog } from 'd3-scale';
import { figure } from '@/lib/units/show';
import { limitWords } from '@/lib/worksheets/limit-words';
import type { ReleaseResult } from '@/lib/worksheets/release/schema';
import { FigureFrame, FRAME } from './figure-frame';
import { FigureText } from './figure-text';
import { NumbersTable } from './numbers-table';

type Held = ReleaseResult['releases'][number] & { ofLimit: number };
const ROW = 46;

/** Each product at most, as a multiple of its limit, on a scale where each step is ten times. */
export function ReleaseFigure({ result }: { result: ReleaseResult }) {
  const held = result.releases.filter((each): each is Held => (each.ofLimit ?? 0) > 0).slice(0, 5);
  if (held.length === 0) return null;
  const times = held.map(({ ofLimit }) => ofLimit);
  const x = scaleLog([Math.min(0.1, ...times) / 2, Math.max(10, ...times) * 2], [20, FRAME.width - 20]);
  const ticks = x.ticks(6).filter((tick) => Math.log10(tick) % 1 === 0);
  const text = held.map(({ name, ofLimit }) => `${name} at most ${figure(ofLimit)} times its limit`).join('; ');
  return (
    <FigureFrame
      title="Release at most, against limits"
      text={`${text}.`}
      note="All at once and evenly in the room, before any air is changed. Each line is ten times the one before it."
      below={
        <NumbersTable
          caption="Release at most and its limit"
          heads={['Substance', 'mg/m³ at most', 'ppm at most', 'Limit', 'Times']}
          rows={held.map(({ name, concentrationAtMost, ppmAtMost, limit, ofLimit }) => [
            ...[name, figure(concentrationAtMost?.value ?? 0), figure(ppmAtMost ?? 0)],
            ...[limit ? limitWords(limit) : '', figure(ofLimit)],
          ])}
        />
      }
    >
      {ticks.map((tick) => (
        <g key={tick}>
          <path
            d={`M${x(tick).toFixed(1)} 26V${FRAME.height - 34}`}
            className={tick === 1 ? 'stroke-kiln' : 'stroke-rule'}
            strokeWidth={tick === 1 ? 2.5 : 1}
          />
          <FigureText x={x(tick)} y={FRAME.height - 14} anchor="middle">
            {tick === 1 ? 'the limit' : `${figure(tick)}×`}
          </FigureText>
        </g>
      ))}
      {held.map(({ substance, name, ofLimit }, i) => (
        <g key={substance}>
          <path
            d={`M20 ${60 + i * ROW}H${x(ofLimit).toFixed(1)}`}
            className={ofLimit > 1 ? 'stroke-ink' : 'stroke-quiet'}
            strokeWidth="8"
          />
          <circle cx={x(ofLimit)} cy={60 + i * ROW} r="6" className="fill-brass stroke-ink" />
          <FigureText x={24} y={50 + i * ROW} strong>
            {`${name}: ${figure(ofLimit)}×`}
          </FigureText>
        </g>
      ))}
    </FigureFrame>
  );
}
