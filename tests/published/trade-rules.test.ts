import { describe, expect, it } from 'vitest';
import { airDensity } from '@/lib/air/air-density';
import { statedExhaust } from '@/lib/air/exhaust';
import { HOODS, airflowOf, type Hood } from '@/lib/air/hood-airflow';
import { leakageOfArea } from '@/lib/air/leakage';
import { balanceRoom } from '@/lib/air/room-balance';
import { VENT_KINDS, VENTS } from '@/lib/air/vent-limits';
import { fromInches } from '@/lib/units/convert';
import { celsius, cubicMetresPerSecond, metres, metresPerSecond, squareMetres } from '@/lib/units/quantity';

/** Rules of the trade that nobody prints with a source: common practice, no source. */
const air = airDensity(celsius(20), metres(0));
const room = { indoor: air, outdoor: air, openings: [] };

describe('a rule of the trade holds (common practice, no source)', () => {
  it('what leaves a room cannot exceed what is let in: let in 100, at most 100 leaves', () => {
    const supply = cubicMetresPerSecond(0.1);
    const { exhausts } = balanceRoom({ ...room, supply, exhausts: [statedExhaust('fan', cubicMetresPerSecond(0.3))] });
    expect(exhausts[0]!.airflow).toBeLessThanOrEqual(0.1 + 1e-12);
    expect(exhausts[0]!.airflow).toBeCloseTo(0.1, 9);
  });

  it('a natural-draught flue is the first to turn when a tight room is exhausted', () => {
    const strictest = Math.max(...VENTS.map((vent) => VENT_KINDS[vent].limit));
    expect(VENT_KINDS['natural-draught'].limit).toBe(strictest);
    const { pressure } = balanceRoom({
      ...room,
      supply: cubicMetresPerSecond(0),
      leakage: leakageOfArea(squareMetres(0.01)),
      exhausts: [statedExhaust('fan', cubicMetresPerSecond(0.03))],
    });
    const turned = VENTS.filter((vent) => pressure < VENT_KINDS[vent].limit);
    expect(turned).toContain('natural-draught');
    expect(turned).not.toContain('direct-vent');
  });

  it('halving the distance to the hood needs far less than half the air', () => {
    const face = { diameter: metres(0.1) };
    const at = (hood: Hood, distance: number) => airflowOf(hood, metresPerSecond(0.5), metres(distance));
    for (const name of HOODS.filter((each) => each.endsWith('-opening')))
      expect(at({ hood: name, face } as Hood, 0.2) / at({ hood: name, face } as Hood, 0.4)).toBeLessThan(0.3);
  });

  it('a small machine’s port, 4 inches, is the pipe sold as 100 mm', () =>
    expect(1000 * fromInches(4)).toBeCloseTo(100, -1));
});
