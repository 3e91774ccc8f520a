import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { SWRConfig } from 'swr';
import { POST } from '@/app/api/worksheets/[name]/route';
import { HoodWorksheet } from '@/components/worksheets/hood-worksheet';
import { typedFrom } from '@/lib/worksheets/hood-airflow/address';

/** The API answers in the same process; nothing is sent over a network. */
const asked = vi.fn((url: string, init: RequestInit) =>
  POST(new Request(`http://localhost${url}`, init), { params: Promise.resolve({ name: url.split('/').pop()! }) }),
);

beforeEach(() => {
  asked.mockClear();
  vi.stubGlobal('fetch', asked);
  window.history.replaceState(null, '', '/worksheets/hood-airflow');
  delete document.documentElement.dataset.units;
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const open = (query: string, followsReader = false) =>
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <HoodWorksheet
        typed={typedFrom(new URLSearchParams(query))}
        faults={[]}
        followsReader={followsReader}
        date="2026-12-01"
      >
        <p>the first answer</p>
      </HoodWorksheet>
    </SWRConfig>,
  );

const ARM = 'hood=flanged-opening&velocity=0.5&distance=0.3&diameter=0.2&units=si';
const airflow = () => document.querySelector('[data-result="airflow"]')?.textContent;
const field = (name: RegExp) => screen.getByRole('textbox', { name });

it('asks nothing until something is changed', async () => {
  open(ARM);
  await new Promise((rest) => setTimeout(rest, 400));
  expect(asked).not.toHaveBeenCalled();
  expect(screen.getByText('the first answer')).toBeDefined();
});

it('reckons again at a change, once typing rests, and keeps the question in the address', async () => {
  open(ARM);
  await userEvent.clear(field(/^Distance/));
  await userEvent.type(field(/^Distance/), '0.15');
  // By hand: 0.75 × 0.5 (10 × 0.0225 + 0.0314159) = 0.0961560 m3/s = 346 m3/h.
  await waitFor(() => expect(airflow()).toBe('346\u2009m³/h'), { timeout: 3000 });
  expect(screen.getByRole('status').textContent).toBe('The hood must draw 346\u00a0m³/h.');
  expect(window.location.search).toBe(`?${ARM.replace('0.3', '0.15')}`);
  expect(asked.mock.calls.length).toBeLessThan(4);
});

it('says beside the field what is wrong and keeps what was typed', async () => {
  open(ARM);
  await userEvent.clear(field(/^Velocity/));
  await userEvent.type(field(/^Velocity/), 'fast');
  expect(await screen.findAllByText('Write a number, such as 0.3.')).toHaveLength(2);
  expect((field(/^Velocity/) as HTMLInputElement).value).toBe('fast');
  expect(field(/^Velocity/).getAttribute('aria-invalid')).toBe('true');
  expect(screen.queryByText('the first answer')).toBeNull();
});

it('names what is still missing without calling it a mistake', async () => {
  open('units=si');
  await userEvent.click(screen.getByRole('radio', { name: /^Enclosure/ }));
  const answer = within(screen.getByRole('region', { name: 'Answer' }));
  expect(await answer.findByText('Open area, all gaps together is missing: an enclosure needs it.')).toBeDefined();
  expect(document.querySelector('[aria-invalid]')).toBeNull();
  expect(screen.queryByRole('alert')).toBeNull();
});

it('takes over the units chosen in the bar and changes the numbers, not the question', async () => {
  open(ARM);
  document.documentElement.dataset.units = 'us';
  await waitFor(() => expect((field(/^Distance/) as HTMLInputElement).value).toBe('11.811'));
  await waitFor(() => expect(airflow()).toBe('740\u2009cfm'), { timeout: 3000 });
});

it('follows the reader at once where the address names no units, and not where it does', async () => {
  document.documentElement.dataset.units = 'us';
  open(ARM.replace('&units=si', ''), true);
  await waitFor(() => expect((field(/^Distance/) as HTMLInputElement).value).toBe('11.811'));
  cleanup();
  open(ARM);
  expect((field(/^Distance/) as HTMLInputElement).value).toBe('0.3');
});

it('says so when no answer comes', async () => {
  asked.mockImplementationOnce(async () => new Response('{}', { status: 503 }));
  open(ARM);
  await userEvent.type(field(/^Distance/), '5');
  expect(await screen.findByText(/No answer came/)).toBeDefined();
});
