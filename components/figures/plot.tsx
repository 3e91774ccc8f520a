import type { ReactNode } from 'react';
import { scaleLinear, type ScaleLinear } from 'd3-scale';
import { figure } from '@/lib/units/show';
import { FRAME } from './figure-frame';
import { FigureText } from './figure-text';

export const MARGIN = { top: 32, right: 18, bottom: 46, left: 58 };
export type Scale = ScaleLinear<number, number>;

/** Scales of a plot within the frame, from 0 to a little above the most of each. */
export function scalesOf(mostX: number, mostY: number, leastY = 0): { x: Scale; y: Scale } {
  return {
    x: scaleLinear([0, mostX || 1], [MARGIN.left, FRAME.width - MARGIN.right]),
    y: scaleLinear([leastY, mostY || 1], [FRAME.height - MARGIN.bottom, MARGIN.top]).nice(),
  };
}

type Props = { x: Scale; y: Scale; labelX: string; labelY: string; children: ReactNode };

/** Axes with their ticks and units; the marks are `children`. */
export function Plot({ x, y, labelX, labelY, children }: Props) {
  const [left, right] = x.range() as [number, number];
  const [bottom, top] = y.range() as [number, number];
  const zero = Math.min(bottom, y(Math.max(0, y.domain()[0]!)));
  return (
    <>
      {y.ticks(5).map((tick) => (
        <g key={tick}>
          <path d={`M${left} ${y(tick).toFixed(1)}H${right}`} className="stroke-rule" strokeWidth="1" />
          <FigureText x={left - 6} y={y(tick) + 4} anchor="end">
            {figure(tick)}
          </FigureText>
        </g>
      ))}
      {x.ticks(5).map((tick) => (
        <FigureText key={tick} x={x(tick)} y={bottom + 18} anchor="middle">
          {figure(tick)}
        </FigureText>
      ))}
      <path
        d={`M${left} ${top}V${bottom}M${left} ${zero.toFixed(1)}H${right}`}
        className="fill-none stroke-ink"
        strokeWidth="1.5"
      />
      <FigureText x={right} y={bottom + 38} anchor="end">
        {labelX}
      </FigureText>
      <FigureText x={8} y={14}>
        {labelY}
      </FigureText>
      {children}
    </>
  );
}
