import { describe, expect, it } from 'vitest';
import { csvOf } from '@/lib/worksheets/csv';
import { hoodTable } from '@/lib/worksheets/hood-airflow/table';

describe('a table for download', () => {
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\tx', ' =1', '\r=1'])('disarms the text %j', (text) => {
    expect(csvOf([[text]])).toBe(`"'${text}"\r\n`);
  });

  it('leaves a negative number a number', () => expect(csvOf([[-1.5, 'a']])).toBe('-1.5,a\r\n'));

  it('quotes what would break a row', () => {
    expect(csvOf([['a,b', 'say "x"', 'two\nlines']])).toBe('"a,b","say ""x""","two\nlines"\r\n');
  });
});

describe('the table of a hood', () => {
  it('is in the units of the address, one unit a column', () => {
    const table = hoodTable(new URLSearchParams('hood=canopy&velocity=200&distance=12&perimeter=16&units=us'));
    if (!table.ok) throw new Error(table.detail);
    expect(table.value[0]).toEqual(['Distance (in)', 'Velocity (fpm)']);
    expect(table.value).toContainEqual([12, 200]);
    expect(table.value).toContainEqual([24, 100]);
  });

  it('refuses a question that cannot be', () => {
    expect(hoodTable(new URLSearchParams('hood=canopy&velocity=x'))).toMatchObject({ ok: false, status: 422 });
    expect(hoodTable(new URLSearchParams('hood=canopy&velocity=1'))).toMatchObject({ ok: false, status: 422 });
  });
});
