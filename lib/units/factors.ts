/**
 * One of each unit in SI. All are exact by definition (NIST SP 811, Appendix B) or products of exact ones, so they are written as
 * those products and not as rounded decimals.
 */
export const FOOT = 0.3048; // m
export const INCH = 0.0254; // m
export const POUND = 0.45359237; // kg
export const STANDARD_GRAVITY = 9.80665; // m/s2

export const SQUARE_FOOT = FOOT ** 2; // m2
export const SQUARE_INCH = INCH ** 2; // m2
export const CUBIC_FOOT = FOOT ** 3; // m3
export const FPM = FOOT / 60; // m/s
export const CFM = CUBIC_FOOT / 60; // m3/s
export const POUND_PER_CUBIC_FOOT = POUND / CUBIC_FOOT; // kg/m3
export const HORSEPOWER = 550 * FOOT * POUND * STANDARD_GRAVITY; // W, 550 ft lbf/s

/**
 * Inch of water gauge, conventional: water of exactly 1000 kg/m3 under standard gravity, 249.08891 Pa. The inch at 39.2 °F is
 * 249.082 Pa and at 60 °F 248.84 Pa; the conventional one is chosen because NIST SP 811 states it without a temperature and gauges
 * do not name theirs. The three lie within 0.1 % of one another.
 */
export const INCH_OF_WATER = 1000 * STANDARD_GRAVITY * INCH; // Pa

/** Inch of mercury, conventional: 13 595.1 kg/m3 under standard gravity. */
export const INCH_OF_MERCURY = 13595.1 * STANDARD_GRAVITY * INCH; // Pa

/** Standard air of the US trade, 0.075 lb/ft3. Source: ASHRAE and ACGIH usage, 1.2014 kg/m3. */
export const STANDARD_AIR = 0.075 * POUND_PER_CUBIC_FOOT; // kg/m3
/** An hour, s. */
export const HOUR = 3600;
