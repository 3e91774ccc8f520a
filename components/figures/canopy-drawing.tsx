import { told } from '@/lib/units/show';
import { Arrow } from './arrow';
import type { CaptureProps } from './capture-figure';
import { FigureText } from './figure-text';

/** A canopy over a tank, and the curtain of air between their edges. */
export function CanopyDrawing({ question, result, system }: CaptureProps) {
  return (
    <g transform="translate(0 16)">
      <path
        d="M200 20V56L110 100M240 20V56L330 100"
        className="fill-none stroke-ink"
        strokeWidth="3"
        strokeLinejoin="round"
      />
      <path d="M140 196V250H300V196" className="fill-none stroke-ink" strokeWidth="3" />
      <path d="M140 206H300" className="stroke-quiet" strokeWidth="1.5" />
      <circle cx="220" cy="206" r="5" className="fill-brass" />
      {[124, 150, 176].map((y) => (
        <g key={y}>
          <Arrow x={158} y={y} length={48} turn={-12} />
          <Arrow x={282} y={y} length={48} turn={192} />
        </g>
      ))}
      <Arrow x={220} y={34} length={46} turn={-90} />
      <path d="M352 100h16M352 206h16M360 102v102" className="stroke-quiet" strokeWidth="1" />
      <FigureText x={262} y={34} strong>
        {told('airflow', result.airflow, system)}
      </FigureText>
      <FigureText x={66} y={128} anchor="middle" strong>
        {told('velocity', question.velocity, system)}
      </FigureText>
      <FigureText x={374} y={158}>
        {told('length', question.distance ?? 0, system)}
      </FigureText>
      <FigureText x={220} y={270} anchor="middle">
        perimeter {told('length', question.perimeter ?? 0, system)}
      </FigureText>
    </g>
  );
}
