import { scaleLinear } from 'd3-scale';
import { curveNatural, line } from 'd3-shape';
import { FRAME } from './figure-frame';

/** Room for the axis below, and at the sides. In units of the drawing. */
const AXIS = 34;
const EDGE = 14;

/** How far round its axis a line of equal velocity reaches, in degrees: a flange or bench stops it, a free opening draws from behind. */
export type Wrap = 'free' | 'flange' | 'bench';
const REACH: Record<Wrap, number> = { free: 128, flange: 90, bench: 90 };

/** What is drawn, in metres: half the height of the opening, how far out, and how the lines wrap. */
export type Field = { half: number; far: number; wrap: Wrap };

/** Scales of one measure for both ways, so that a circle is a circle; the hood takes the left third. */
export function scalesOf({ half, far, wrap }: Field) {
  const room = { width: FRAME.width - 2 * EDGE, height: FRAME.height - AXIS - EDGE };
  const behind = far * 0.5;
  const tall = wrap === 'bench' ? 2 * half + far * 0.95 : 2 * (half + far * 0.95);
  const measure = Math.min(room.width / (far + behind), room.height / tall);
  const left = Math.max(EDGE + measure * behind, FRAME.width / 3);
  const middle = wrap === 'bench' ? FRAME.height - AXIS - measure * half : EDGE + room.height / 2;
  return {
    x: scaleLinear([0, far], [left, left + measure * far]),
    y: scaleLinear([0, far], [middle, middle - measure * far]),
  };
}

/**
 * The line of equal velocity that crosses the axis at `distance`: through the axis where the equation puts it, and round the edge of
 * the opening as a sketch, since the equation says nothing beside the axis.
 */
export function velocityLine(field: Field, distance: number): string {
  const { x, y } = scalesOf(field);
  const steps = 24;
  const to = REACH[field.wrap];
  const from = field.wrap === 'bench' ? 0 : -to;
  const floor = field.wrap === 'bench' ? -field.half : 0;
  const points = Array.from({ length: steps + 1 }, (_, i): [number, number] => {
    const angle = ((from + ((to - from) * i) / steps) * Math.PI) / 180;
    const height = field.wrap === 'bench' ? 2 * field.half + distance : field.half + distance;
    return [x(distance * Math.cos(angle)), y(floor + height * Math.sin(angle))];
  });
  return line().curve(curveNatural)(points.map(([a, b]) => [Math.round(a * 10) / 10, Math.round(b * 10) / 10]))!;
}
