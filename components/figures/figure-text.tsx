import type { ReactNode } from 'react';

type Props = { x: number; y: number; anchor?: 'start' | 'middle' | 'end'; strong?: boolean; children: ReactNode };

/** A label in a drawing, with a halo of the ground so that lines may pass under it. */
export function FigureText({ x, y, anchor = 'start', strong, children }: Props) {
  return (
    <text
      x={x.toFixed(1)}
      y={y.toFixed(1)}
      textAnchor={anchor}
      fontSize="13"
      fontWeight={strong ? 650 : undefined}
      strokeWidth="4"
      strokeLinejoin="round"
      paintOrder="stroke"
      className={`stroke-surface ${strong ? 'fill-ink' : 'fill-quiet'}`}
    >
      {children}
    </text>
  );
}
