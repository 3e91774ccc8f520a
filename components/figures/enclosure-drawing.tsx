import { told } from '@/lib/units/show';
import { Arrow } from './arrow';
import type { CaptureProps } from './capture-figure';
import { FigureText } from './figure-text';

/** A cabinet with a gap on each side, the work within, and the duct that draws on it. */
export function EnclosureDrawing({ question, result, system }: CaptureProps) {
  return (
    <g transform="translate(0 16)">
      <path
        d="M110 190V70H200V30M240 30V70H330V190M110 214V230H330V214"
        className="fill-none stroke-ink"
        strokeWidth="3"
        strokeLinejoin="round"
      />
      <path d="M170 230v-24h100v24" className="fill-rule stroke-quiet" strokeWidth="1.5" />
      <circle cx="220" cy="198" r="5" className="fill-brass" />
      {[196, 208].map((y) => (
        <g key={y}>
          <Arrow x={124} y={y} length={34} />
          <Arrow x={316} y={y} length={34} turn={180} />
        </g>
      ))}
      <Arrow x={220} y={36} length={46} turn={-90} />
      <FigureText x={262} y={44} strong>
        {told('airflow', result.airflow, system)}
      </FigureText>
      <FigureText x={98} y={178} anchor="end" strong>
        {told('velocity', question.velocity, system)}
      </FigureText>
      <FigureText x={220} y={256} anchor="middle">
        {told('area', question.openArea ?? 0, system)} of gaps, all together
      </FigureText>
    </g>
  );
}
