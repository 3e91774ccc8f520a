import { describe, expect, it } from 'vitest';
import { readSearchAddress, searchAddress } from '@/lib/search/search-address';

describe('the address of the results page', () => {
  it('asks with the first q and a kind that is one', () => {
    expect(readSearchAddress({ q: [' pvc ', 'abs'], kind: 'material' })).toEqual({ q: 'pvc', kind: 'material' });
  });

  it.each([undefined, 'plastic', '', '__proto__', ['guides']])('ignores the kind %j', (kind) => {
    expect(readSearchAddress({ q: 'pvc', kind })).toEqual({ q: 'pvc' });
  });

  it('takes a missing question for an empty one', () => {
    expect(readSearchAddress({})).toEqual({ q: '' });
  });

  it.each([199, 200, 201])('keeps 200 of %i characters', (length) => {
    expect(readSearchAddress({ q: 'x'.repeat(length) }).q).toHaveLength(Math.min(200, length));
  });

  it('is written so that it reads back the same', () => {
    const address = new URL(searchAddress('Cr(VI) & 50 % + “CO₂”', 'substance'), 'http://127.0.0.1');
    expect(readSearchAddress(Object.fromEntries(address.searchParams))).toEqual({
      q: 'Cr(VI) & 50 % + “CO₂”',
      kind: 'substance',
    });
  });
});
