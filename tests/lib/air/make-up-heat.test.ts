import { describe, expect, it } from 'vitest';
import { makeUpHeat } from '@/lib/air/make-up-heat';
import { fromCfm } from '@/lib/units/convert';
import { STANDARD_AIR } from '@/lib/units/factors';
import { celsius, cubicMetresPerSecond, kilogramsPerCubicMetre } from '@/lib/units/quantity';

const heat = (airflow: number, indoor: number, outdoor: number) =>
  makeUpHeat(cubicMetresPerSecond(airflow), kilogramsPerCubicMetre(STANDARD_AIR), celsius(indoor), celsius(outdoor));
const BTU_PER_HOUR = 1055.056 / 3600; // W

describe('the heat for the air let in', () => {
  it('is within half a percent of the 1.08 × cfm × °F of the US trade (from memory)', () =>
    expect(heat(fromCfm(1000), 70 / 1.8, 20 / 1.8) / BTU_PER_HOUR / (1.08 * 1000 * 50)).toBeCloseTo(1, 2));

  it('is negative where the air let in has to be cooled, and none where both are alike', () => {
    expect(heat(0.2, 22, 30)).toBeLessThan(0);
    expect(heat(0.2, 22, 22)).toBe(0);
  });

  it('is refused for air that leaves instead of coming in', () => expect(() => heat(-0.1, 20, 0)).toThrow(RangeError));
});
