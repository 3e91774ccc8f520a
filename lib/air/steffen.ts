/** A point of a curve; x rises strictly from one to the next. */
export type Point = readonly [x: number, y: number];

const slopeBetween = ([x0, y0]: Point, [x1, y1]: Point) => (y1 - y0) / (x1 - x0);

function slopeInside(before: Point, at: Point, after: Point): number {
  const [h0, h1] = [at[0] - before[0], after[0] - at[0]];
  const [s0, s1] = [slopeBetween(before, at), slopeBetween(at, after)];
  const parabola = (s0 * h1 + s1 * h0) / (h0 + h1);
  return (Math.sign(s0) + Math.sign(s1)) * Math.min(Math.abs(s0), Math.abs(s1), 0.5 * Math.abs(parabola)) || 0;
}

function slopeAtEnd(end: Point, next: Point, slopeNext: number): number {
  const slope = (3 * slopeBetween(end, next) - slopeNext) / 2;
  const chord = slopeBetween(end, next);
  if (slope * chord <= 0) return 0;
  return Math.abs(slope) > 2 * Math.abs(chord) ? 2 * chord : slope;
}

/** The slopes of the curve at its points. */
export function steffenSlopes(points: readonly Point[]): number[] {
  if (points.length === 2) return Array(2).fill(slopeBetween(points[0]!, points[1]!));
  const inside = points.slice(1, -1).map((at, i) => slopeInside(points[i]!, at, points[i + 2]!));
  const n = points.length;
  return [
    slopeAtEnd(points[0]!, points[1]!, inside[0]!),
    ...inside,
    slopeAtEnd(points[n - 1]!, points[n - 2]!, inside.at(-1)!),
  ];
}

/** The index of the first point at or to the right of x, by halving. */
function firstFrom(points: readonly Point[], x: number): number {
  let [low, high] = [0, points.length - 1];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (points[middle]![0] >= x) high = middle;
    else low = middle + 1;
  }
  return low;
}

/**
 * A smooth curve through points that rises only where they rise and falls only where they fall: it never overshoots them. Between two
 * points a cubic. Source: Steffen, Astronomy and Astrophysics 239 (1990) 443; the same that the plot draws.
 * @returns y at an x, within the points; outside them the end point's
 * @throws RangeError for fewer than two points, or an x that does not rise
 */
export function steffen(points: readonly Point[]): (x: number) => number {
  if (points.length < 2 || points.some(([x], i) => i > 0 && !(x > points[i - 1]![0])))
    throw new RangeError('a curve has at least two points, each to the right of the one before');
  const slopes = steffenSlopes(points);
  return (x) => {
    if (x <= points[0]![0]) return points[0]![1];
    if (x >= points.at(-1)![0]) return points.at(-1)![1];
    const right = firstFrom(points, x);
    const [[x0, y0], [x1, y1]] = [points[right - 1]!, points[right]!];
    const [h, t] = [x1 - x0, (x - x0) / (x1 - x0)];
    const [m0, m1] = [slopes[right - 1]! * h, slopes[right]! * h];
    const rise = y1 - y0;
    return y0 + t * (m0 + t * (3 * rise - 2 * m0 - m1 + t * (m0 + m1 - 2 * rise)));
  };
}
