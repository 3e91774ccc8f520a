import { describe, expect, it } from 'vitest';
import { airflowOfChanges } from '@/lib/air/air-changes';
import { timeUntil } from '@/lib/air/decay';
import { cubicMetres } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

/** Minutes until 90, 99 and 99.9 % are gone, by air changes an hour: CDC, MMWR 1994;43(RR-13), Table S3-1, p. 72. */
const TABLE = `
  1 138 276 414 |  2 69 138 207 |  3 46 92 138 |  4 35 69 104 |  5 28 55 83
  6  23  46  69 |  7 20  39  59 |  8 17 35  52 |  9 15 31  46 | 10 14 28 41
  11 13  25  38 | 12 12  23  35 | 13 11 21  32 | 14 10 20  30 | 15  9 18 28
  16  9  17  26 | 17  8  16  24 | 18  8 15  23 | 19  7 15  22 | 20  7 14 21
  25  6  11  17 | 30  5   9  14 | 35  4  8  12 | 40  3  7  10 | 45  3  6  9 | 50 3 6 8`;
const SHARES = [0.1, 0.01, 0.001];
const room = cubicMetres(75);

const rows = TABLE.split(/[|\n]/)
  .filter((text) => text.trim() !== '')
  .flatMap((text) => {
    const [changes, ...minutes] = text.trim().split(/\s+/).map(Number);
    return minutes.map((published, i): Row => {
      const ours = timeUntil(SHARES[i]!, airflowOfChanges(changes!, room), room) / 60;
      const given = `${changes} changes, ${100 * (1 - SHARES[i]!)} %`;
      return { id: `S3-1/${changes}/${i}`, given, ours, published, within: { absolute: 0.5 }, source: 'MMWR 1994' };
    });
  });

describe('the published time to clear', () => {
  it('is here in all its 78 cells', () => expect(rows).toHaveLength(78));

  it.each(rows)('comes out for $given, in minutes', expectPublished);
});
