import { describe, expect, it } from 'vitest';
import { MONOXIDE_LEVELS } from '@/lib/air/carbon-monoxide';

const of = (body: string, over: RegExp) =>
  MONOXIDE_LEVELS.filter((level) => level.body === body && over.test(level.over)).map(({ value }) => value);

describe('the levels of carbon monoxide', () => {
  // Read in 29 CFR 1910.1000 Table Z-1, the IDLH documentation of NIOSH (1994) and an alarm maker’s print of UL 2034.
  it('are those that each body printed', () => {
    expect(of('OSHA', /eight hours/)).toEqual([50]);
    expect(of('NIOSH', /shift/)).toEqual([35]);
    expect(of('NIOSH', /at once/)).toEqual([1200]);
    expect(of('ACGIH', /eight hours/)).toEqual([25]);
    expect(of('UL', /alarm after/)).toEqual([70, 150, 400]);
    expect(of('UL', /silent/)).toEqual([30]);
  });

  it('each name the body that set it, the time it is for and where it was read, and none is called harmless', () => {
    for (const { body, value, over, source } of MONOXIDE_LEVELS) {
      expect(value).toBeGreaterThan(0);
      expect(source.length).toBeGreaterThan(5);
      expect(`${body} ${over} ${source}`).not.toMatch(/safe|harmless|acceptable/i);
    }
  });

  it('are each told once', () => {
    const told = MONOXIDE_LEVELS.map(({ body, value }) => `${body} ${value}`);
    expect(new Set(told).size).toBe(told.length);
  });
});
