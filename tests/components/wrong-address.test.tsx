import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { WrongAddress, wordsOf } from '@/components/layout/wrong-address';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

describe('the words of a wrong address', () => {
  it.each([
    ['/materials/pvc-sheet', 'pvc sheet'],
    ['/pvc.html', 'pvc'],
    ['/materials/tropical%20hardwood', 'tropical hardwood'],
    ['/materials/%E0%A4%A', 'E0 A4 A'],
    ['/', ''],
  ])('of %s are “%s”', (path, words) => {
    expect(wordsOf(path)).toBe(words);
  });
});

describe('a wrong address', () => {
  it('is searched for, and what is found is listed', async () => {
    const fetched = vi.fn(async (address: string) => {
      const hits = [{ kind: 'material', slug: 'pvc', title: 'PVC', summary: address, url: '/materials/pvc' }];
      return Response.json({ hits });
    });
    vi.stubGlobal('fetch', fetched);
    window.history.replaceState(null, '', '/materials/pvc-sheet');
    render(<WrongAddress />);
    const link = await screen.findByRole('link', { name: 'PVC' });
    expect(link.getAttribute('href')).toBe('/materials/pvc');
    expect(fetched.mock.calls[0]?.[0]).toBe('/api/search?limit=5&q=pvc%20sheet');
  });
});
