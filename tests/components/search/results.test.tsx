import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Results } from '@/components/search/results';
import type { SearchAnswer, SearchHit } from '@/lib/search/search';

afterEach(cleanup);

const PVC: SearchHit = {
  ...{
    kind: 'material',
    slug: 'pvc',
    title: 'PVC',
    summary: 'Comes apart into hydrogen chloride.',
    url: '/materials/pvc',
  },
  ...{ score: 50, matched: ['vinyl'], control: 'prohibited' },
};
const NONE = { material: 0, process: 0, substance: 0, guide: 0, worksheet: 0, sheet: 0 };

const answerWith = (rest: Partial<SearchAnswer>): SearchAnswer => ({
  query: 'vinyl',
  total: 0,
  counts: NONE,
  hits: [],
  ...rest,
});
const found = answerWith({ total: 1, counts: { ...NONE, material: 1, process: 2 }, hits: [PVC] });

describe('the results of a search', () => {
  it('shows of a hit its kind, title, summary, control and the words that found it', () => {
    render(<Results answer={found} />);
    const [hit] = screen.getAllByRole('listitem').filter((item) => within(item).queryByRole('heading'));
    expect(within(hit!).getByRole('link', { name: 'PVC' }).getAttribute('href')).toBe('/materials/pvc');
    expect(hit!.textContent).toMatch(/Material.*PVC.*Comes apart.*Prohibited.*Found by: vinyl/);
  });

  it('puts the check of a named pair before every hit', () => {
    const pair = {
      ...{
        materials: ['pvc'],
        process: 'laser-cutting',
        title: 'PVC: Laser cutting',
        control: 'prohibited' as const,
        basis: 'reviewed' as const,
      },
      ...{ reason: 'It gives off hydrogen chloride.', url: '/check?material=pvc&process=laser-cutting' },
    };
    render(<Results answer={{ ...found, pair }} />);
    const headings = screen.getAllByRole('heading').map((heading) => heading.textContent);
    expect(headings).toEqual(['PVC: Laser cutting', 'PVC']);
    expect(screen.getByText('It gives off hydrogen chloride.')).toBeTruthy();
    expect(screen.getByRole('link', { name: /whole check/ }).getAttribute('href')).toBe(pair.url);
  });

  it('tells to treat a pair without a reviewed statement as prohibited', () => {
    const pair = {
      materials: ['x'],
      process: 'sawing',
      title: 'X: Sawing',
      control: 'unknown' as const,
      basis: 'none' as const,
      reason: 'r',
      url: '/',
    };
    render(<Results answer={answerWith({ pair })} />);
    expect(screen.getByText(/Treat it as prohibited until one does/)).toBeTruthy();
  });

  it('shows a wrong belief with what holds instead', () => {
    const correction = { claim: 'Acetal gives off hydrogen fluoride.', truth: 'There is no fluorine in it.' };
    render(<Results answer={{ ...found, hits: [{ ...PVC, correction }] }} />);
    expect(screen.getByText(/Often said, and wrong/).parentElement!.textContent).toBe(
      'Often said, and wrong: Acetal gives off hydrogen fluoride. Instead: There is no fluorine in it.',
    );
  });

  it('narrows by kind with links that carry the question and the counts', () => {
    render(<Results answer={found} kind="process" />);
    const links = within(screen.getByRole('navigation')).getAllByRole('link');
    expect(
      links.map((link) => [link.textContent, link.getAttribute('href'), link.getAttribute('aria-current')]),
    ).toEqual([
      ['Everything 3', '/search?q=vinyl', null],
      ['Materials 1', '/search?q=vinyl&kind=material', null],
      ['Processes 2', '/search?q=vinyl&kind=process', 'true'],
    ]);
  });

  it('says what to do when nothing was found, and shows no counts', () => {
    render(<Results answer={answerWith({ query: 'zorblax' })} />);
    expect(screen.getByText(/“zorblax”/)).toBeTruthy();
    expect(screen.getByText(/that nobody can name is not run/)).toBeTruthy();
    expect(screen.getByRole('link', { name: 'find out what it is' }).getAttribute('href')).toBe(
      '/guides/identifying-plastics',
    );
    expect(screen.queryByRole('navigation')).toBeNull();
  });

  it('points to the other kinds when only the one asked for has no match', () => {
    render(<Results answer={{ ...found, total: 0, hits: [] }} kind="guide" />);
    expect(screen.getByText(/None of the matches is among the guides/)).toBeTruthy();
  });

  it('says how many there are when it shows fewer', () => {
    render(<Results answer={{ ...found, total: 41 }} />);
    expect(screen.getByText('The best 1 of 41')).toBeTruthy();
  });
});
