import { describe, expect, it } from 'vitest';
import {
  depressurisationBy,
  effectiveLeakageArea,
  leakageAirflow,
  leakageOfArea,
  leakageOfChanges,
} from '@/lib/air/leakage';
import { toCfm } from '@/lib/units/convert';
import { SQUARE_INCH } from '@/lib/units/factors';
import { cubicMetres, cubicMetresPerSecond, squareMetres } from '@/lib/units/quantity';

const room = cubicMetres(240);

describe('the cracks of a room', () => {
  it('have a leakage area of the airflow in cfm at 50 Pa over 18.2, in square inches, as load-calculation papers print', () => {
    const cracks = leakageOfChanges(6, room);
    const squareInches = toCfm(cracks.airflow) / 18.2;
    expect(effectiveLeakageArea(cracks) / SQUARE_INCH / squareInches).toBeCloseTo(1, 2);
  });

  it('have the leakage area that they were described by', () =>
    expect(effectiveLeakageArea(leakageOfArea(squareMetres(0.034)))).toBeCloseTo(0.034, 12));

  it('let in what a fan in the door measured, at the difference that it measured it at, and out the same the other way', () => {
    const cracks = leakageOfChanges(6, room);
    expect(leakageAirflow(cracks, 50)).toBeCloseTo((6 * 240) / 3600, 12);
    expect(leakageAirflow(cracks, -50)).toBeCloseTo((-6 * 240) / 3600, 12);
    expect(leakageAirflow(cracks, 0)).toBe(0);
  });

  it('let in 2^0.65 times as much at twice the difference', () => {
    const cracks = leakageOfArea(squareMetres(0.02));
    expect(leakageAirflow(cracks, 16) / leakageAirflow(cracks, 8)).toBeCloseTo(1.569168, 6);
  });

  it('are refused where they cannot be', () => {
    expect(() => leakageOfArea(squareMetres(-0.1))).toThrow(RangeError);
    expect(() => leakageOfChanges(NaN, room)).toThrow(RangeError);
    expect(() => leakageOfChanges(5, cubicMetres(0))).toThrow(RangeError);
    expect(() => depressurisationBy(cubicMetresPerSecond(1), leakageOfChanges(0, room))).toThrow(RangeError);
  });
});
