import { describe, expect, it } from 'vitest';
import { ROOM_AIR } from '@/lib/air/air-density';
import { fanExhaust, statedExhaust, UNKNOWN_REACH } from '@/lib/air/exhaust';
import { fanOf } from '@/lib/air/fan-curve';
import { cubicMetresPerSecond, metres, pascals } from '@/lib/units/quantity';
import { systemPressure } from '@/lib/air/system-pressure';

const point = (airflow: number, staticPressure: number) => ({
  ...{ airflow: cubicMetresPerSecond(airflow), staticPressure: pascals(staticPressure) },
});

describe('an exhaust of which only the airflow is known', () => {
  const { airflowAt } = statedExhaust('fan', cubicMetresPerSecond(0.2));

  it('holds it while the room is less than nine tenths of its reach down', () => {
    expect(airflowAt(0)).toBe(0.2);
    expect(airflowAt(-0.9 * UNKNOWN_REACH)).toBeCloseTo(0.2, 12);
  });

  it('has none left at its reach, and never blows backwards', () => {
    expect(airflowAt(-UNKNOWN_REACH)).toBe(0);
    expect(airflowAt(-10 * UNKNOWN_REACH)).toBe(0);
  });
});

describe('a fan on its duct', () => {
  const fan = fanOf([point(0, 100), point(0.1, 80), point(0.2, 0)]);
  const system = {
    entryLossFactor: 0.5,
    runs: [{ duct: 'galvanised-steel' as const, diameter: metres(0.15), length: metres(3) }],
  };
  const exhaust = fanExhaust('fan', fan, system, ROOM_AIR);
  const lossAt = systemPressure(system, ROOM_AIR);

  it.each([0, -20, -60, -99])('lifts its duct and the room, at %d Pa', (room) => {
    const airflow = exhaust.airflowAt(room);
    expect(airflow).toBeGreaterThan(0);
    expect(fan.pressureAt(airflow) - lossAt(airflow)).toBeCloseTo(-room, 9);
  });

  it('moves nothing where the room pulls as hard as it can, and lets air back in where it pulls harder', () => {
    expect(exhaust.airflowAt(-100)).toBeCloseTo(0, 12);
    const back = exhaust.airflowAt(-130);
    expect(back).toBeLessThan(0);
    expect(lossAt(-back)).toBeCloseTo(30, 9);
  });
});
