import type { Plan, PlanReading } from './plan-schema';

/** Below this share of its baseline an exhaust is out of use until it is mended: common practice, no source. */
export const OUT_OF_USE_BELOW = 0.8;
/** Months between two readings where nothing is said: common practice, no source. */
export const CHECK_EVERY = 3;

/** How an exhaust stands: its first reading of a kind is the baseline. `drift` is the last over the first, less 1. `due` is a date. */
export type Upkeep = {
  exhaust: string;
  kind: 'face-velocity' | 'static-pressure';
  baseline: number;
  last: number;
  lastDate: string;
  drift: number;
  due: string;
  overdue: boolean;
  outOfUse: boolean;
};

type Full = { exhaust: string; kind: Upkeep['kind']; date: string; value: number };

function full({ exhaust, kind, date, velocity, pressure }: PlanReading): Full[] {
  const value = kind === 'static-pressure' ? pressure : velocity;
  return exhaust && kind && date && value !== undefined ? [{ exhaust, kind, date, value }] : [];
}

/** A date some months later; the last of a shorter month stands for a day it lacks. */
export function monthsAfter(date: string, months: number): string {
  const [year, month, day] = date.split('-').map(Number) as [number, number, number];
  const at = new Date(Date.UTC(year, month - 1 + months, 1));
  const last = new Date(Date.UTC(at.getUTCFullYear(), at.getUTCMonth() + 1, 0)).getUTCDate();
  at.setUTCDate(Math.min(day, last));
  return at.toISOString().slice(0, 10);
}

/**
 * Each exhaust's readings against their baseline. A face velocity that has fallen, or a static pressure that has changed either way by
 * more than a fifth, puts it out of use: suction at a tap rises when what is before it blocks and falls when what is behind it does.
 * @param today as 2026-12-01
 */
export function upkeepOf({ readings = [], checkEvery = CHECK_EVERY }: Plan, today: string): Upkeep[] {
  return [...grouped(readings.flatMap(full)).values()].flatMap((all) => {
    const sorted = [...all].sort((a, b) => a.date.localeCompare(b.date));
    const [first, last] = [sorted[0]!, sorted.at(-1)!];
    if (first.value <= 0) return [];
    const share = last.value / first.value;
    const due = monthsAfter(last.date, Math.round(checkEvery));
    return [
      {
        ...{ exhaust: last.exhaust, kind: last.kind, baseline: first.value, last: last.value, lastDate: last.date },
        ...{ drift: share - 1, due, overdue: due < today },
        outOfUse: share < OUT_OF_USE_BELOW || (last.kind === 'static-pressure' && share > 2 - OUT_OF_USE_BELOW),
      },
    ];
  });
}

function grouped(all: Full[]): Map<string, Full[]> {
  const groups = new Map<string, Full[]>();
  for (const each of all) {
    const key = `${each.exhaust} ${each.kind}`;
    groups.set(key, [...(groups.get(key) ?? []), each]);
  }
  return groups;
}
