import { describe, expect, it } from 'vitest';
import { VENT_KINDS, VENTS } from '@/lib/air/vent-limits';

describe('the limits by kind of vent', () => {
  // The table of the Building Performance Institute as an audit form reprints it: the strictest row of each kind.
  it.each([
    ['natural-draught', -2],
    ['fan-assisted', -15],
    ['power-vented', -15],
    ['direct-vent', -50],
  ] as const)('holds a %s appliance to the printed %d Pa', (vent, limit) => expect(VENT_KINDS[vent].limit).toBe(limit));

  it('hold an open hearth as strictly as the strictest of them, and say that this is from memory', () => {
    expect(VENT_KINDS['open-hearth'].limit).toBe(Math.max(...VENTS.map((vent) => VENT_KINDS[vent].limit)));
    expect(VENT_KINDS['open-hearth'].source).toMatch(/from memory/i);
  });

  it('name where each is from', () => {
    for (const vent of VENTS) expect(VENT_KINDS[vent].source).toMatch(/Building Performance Institute|From memory/);
  });
});
