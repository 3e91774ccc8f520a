import { unit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import {
  CFM,
  CUBIC_FOOT,
  FOOT,
  FPM,
  INCH,
  INCH_OF_WATER,
  POUND,
  POUND_PER_CUBIC_FOOT,
  SQUARE_FOOT,
  SQUARE_INCH,
} from '@/lib/units/factors';

const RELATIVE = 1e-12;
const exactly = (given: number, expected: number) => expect(Math.abs(given / expected - 1)).toBeLessThan(RELATIVE);

/** Expected values come from another library's unit tables, to within the rounding of a double. */
describe('a factor equals that of mathjs', () => {
  it.each([
    ['foot', FOOT, unit(1, 'ft').toNumber('m')],
    ['inch', INCH, unit(1, 'in').toNumber('m')],
    ['pound', POUND, unit(1, 'lbm').toNumber('kg')],
    ['square foot', SQUARE_FOOT, unit(1, 'sqft').toNumber('m^2')],
    ['square inch', SQUARE_INCH, unit(1, 'sqin').toNumber('m^2')],
    ['cubic foot', CUBIC_FOOT, unit(1, 'cuft').toNumber('m^3')],
    ['foot per minute', FPM, unit(1, 'ft/min').toNumber('m/s')],
    ['cubic foot per minute', CFM, unit(1, 'cuft/min').toNumber('m^3/s')],
    ['pound per cubic foot', POUND_PER_CUBIC_FOOT, unit(1, 'lbm/cuft').toNumber('kg/m^3')],
    // mathjs has no inch of water; its centimetre of water is 98.0665 Pa, the conventional one.
    ['inch of water', INCH_OF_WATER, unit(2.54, 'cmH2O').toNumber('Pa')],
  ])('%s', (_, ours, theirs) => exactly(ours, theirs));
});
