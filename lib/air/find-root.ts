import { finite } from './domain';

const MOST = 200;

/**
 * A root of a continuous function between two points where it has opposite signs, to the last digits a double holds. Each step is
 * interpolation where that is sound and bisection where it is not, so it always ends. Source: Brent, Algorithms for Minimization
 * without Derivatives (1973), ch. 4.
 * @throws RangeError where the signs are alike, or a value is not finite
 */
export function findRoot(f: (x: number) => number, from: number, to: number): number {
  let [a, b] = [from, to];
  let [fa, fb] = [finite(f(a)), finite(f(b))];
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (fa > 0 === fb > 0) throw new RangeError('the root is not between the two points');
  let [c, fc, before, last] = [a, fa, b - a, b - a];
  for (let i = 0; i < MOST && fb !== 0; i += 1) {
    if (fb > 0 === fc > 0) [c, fc, before, last] = [a, fa, b - a, b - a];
    if (Math.abs(fc) < Math.abs(fb)) [a, b, c, fa, fb, fc] = [b, c, b, fb, fc, fb];
    const least = Number.EPSILON * Math.abs(b);
    const half = (c - b) / 2;
    if (Math.abs(half) <= least) break;
    const step = interpolated(a, b, c, fa, fb, fc);
    const sound = Math.abs(before) >= least && Math.abs(fa) > Math.abs(fb) && step !== undefined;
    if (sound && 2 * Math.abs(step) < Math.min(3 * Math.abs(half) - least, Math.abs(before)) && step * half > 0)
      [before, last] = [last, step];
    else [before, last] = [half, half];
    [a, fa] = [b, fb];
    b += Math.abs(last) > least ? last : Math.sign(half) * Math.max(least, Number.MIN_VALUE);
    fb = finite(f(b));
  }
  return b;
}

/** The step from b that a parabola through three points, or a line through two, would take. */
function interpolated(a: number, b: number, c: number, fa: number, fb: number, fc: number): number | undefined {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (s - 1) || undefined;
  const [q, r] = [fa / fc, fb / fc];
  const p = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  const step = -p / ((q - 1) * (r - 1) * (s - 1));
  return Number.isFinite(step) ? step : undefined;
}

/**
 * The root of a function that rises from below 0 at `from`: the far end is found by doubling.
 * @param reach the first guess of how far off the root is, above 0
 * @throws RangeError where it does not rise above 0 within what a double holds
 */
export function findRisingRoot(f: (x: number) => number, from: number, reach: number): number {
  let [low, step] = [from, reach];
  for (let i = 0; i < 400; i += 1) {
    const high = from + step;
    if (f(high) >= 0) return findRoot(f, low, high);
    [low, step] = [high, step * 2];
  }
  throw new RangeError('the function does not rise above 0');
}
