import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { SWRConfig } from 'swr';
import { WorksheetView } from '@/components/worksheets/asked/worksheet-view';
import { worksheetNamed } from '@/lib/worksheets/list';

/** The worksheet answers in the same process; nothing is sent over a network. */
const asked = vi.fn(async (url: string, init: RequestInit) => {
  const outcome = worksheetNamed(url.split('/').pop()!)!.run(JSON.parse(String(init.body)));
  return outcome.ok
    ? Response.json(outcome.value)
    : Response.json({ detail: outcome.detail, errors: outcome.errors }, { status: outcome.status });
});

beforeEach(() => {
  asked.mockClear();
  vi.stubGlobal('fetch', asked);
  window.history.replaceState(null, '', '/worksheets/dilution');
  delete document.documentElement.dataset.units;
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const open = (name: 'dilution' | 'duct-pressure', query: string, followsReader = false) =>
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <WorksheetView {...{ name, query, followsReader, faults: [], date: '2026-12-01' }}>
        <p>the first answer</p>
      </WorksheetView>
    </SWRConfig>,
  );

const DILUTION = 'generation.massRate=20&limit.value=40&limit.unit=mg%2Fm3&mixingFactor=5&units=si';
const DUCT =
  'airflow=500&hood.entryLossFactor=0.5&runs.0.duct=galvanised-steel&runs.0.diameter=125&runs.0.length=8&units=si';
const airflow = () => document.querySelector('[data-result="airflow"]')?.textContent;
const field = (name: RegExp) => screen.getByRole('textbox', { name }) as HTMLInputElement;
const answer = () => within(screen.getByRole('region', { name: 'Answer' }));
const inAddress = (name: string) => new URLSearchParams(window.location.search).get(name);

it('asks nothing until something is changed', async () => {
  open('dilution', DILUTION);
  await new Promise((rest) => setTimeout(rest, 400));
  expect(asked).not.toHaveBeenCalled();
  expect(screen.getByText('the first answer')).toBeDefined();
});

it('reckons again at a change, once typing rests, and keeps the question in the address', async () => {
  open('dilution', DILUTION);
  await userEvent.clear(field(/^Limit/));
  await userEvent.type(field(/^Limit/), '50');
  // By hand: 20 mg/s over 50 mg/m3, five times: 2 m3/s = 7200 m3/h.
  await waitFor(() => expect(airflow()).toBe('7200\u2009m³/h'), { timeout: 3000 });
  expect(screen.getByRole('status').textContent).toBe('The answer has been reckoned anew.');
  expect(inAddress('limit.value')).toBe('50');
  expect(asked.mock.calls.length).toBeLessThan(4);
  expect(screen.queryByText('the first answer')).toBeNull();
});

it('says beside the field what is wrong and keeps what was typed', async () => {
  open('dilution', DILUTION);
  await userEvent.clear(field(/^Limit/));
  await userEvent.type(field(/^Limit/), 'low');
  expect(await answer().findByText('Limit: Write a number, such as 0.3.')).toBeDefined();
  expect(field(/^Limit/).value).toBe('low');
  expect(field(/^Limit/).getAttribute('aria-invalid')).toBe('true');
});

it('names what is still missing, with its row, without calling it a mistake', async () => {
  open('duct-pressure', DUCT);
  await userEvent.clear(field(/^Length/));
  expect(await answer().findByText('Run 1: Length is missing.')).toBeDefined();
  expect(document.querySelector('[aria-invalid]')).toBeNull();
  expect(screen.queryByRole('alert')).toBeNull();
});

it('warns of what is ticked at once, before any number is there', async () => {
  open('dilution', 'units=si');
  await userEvent.click(screen.getByRole('checkbox', { name: /carbon monoxide alarm/ }));
  expect(await answer().findByText(/everybody out into fresh air/)).toBeDefined();
  expect(answer().queryByText('the first answer')).toBeNull();
});

it('shows no answer of an earlier question where all was cleared', async () => {
  open('dilution', 'limit.value=40');
  await userEvent.clear(field(/^Limit/));
  expect(await answer().findByText('Nothing asked yet')).toBeDefined();
  expect(screen.queryByText('the first answer')).toBeNull();
  await new Promise((rest) => setTimeout(rest, 400));
  expect(asked).not.toHaveBeenCalled();
});

it('adds a row at once, keeps what was typed, and puts the keyboard in it', async () => {
  open('duct-pressure', DUCT);
  await userEvent.clear(field(/^Length/));
  await userEvent.type(field(/^Length/), '16');
  await userEvent.click(screen.getByRole('button', { name: 'Add a run' }));
  const second = screen.getByRole('group', { name: 'Run 2' });
  expect(second.contains(document.activeElement)).toBe(true);
  expect(
    within(screen.getByRole('group', { name: 'Run 1' })).getByRole<HTMLInputElement>('textbox', { name: /^Length/ })
      .value,
  ).toBe('16');
  await userEvent.click(within(second).getByRole('button', { name: 'Add a fitting' }));
  expect(screen.getByRole('group', { name: 'Fitting 1' }).contains(document.activeElement)).toBe(true);
});

it('takes a row away and leaves the keyboard on the others', async () => {
  open('duct-pressure', `${DUCT}&runs.1.duct=smooth-plastic&runs.1.diameter=100&runs.1.length=3`);
  await userEvent.click(screen.getByRole('button', { name: 'Take away run 1' }));
  expect(field(/^Length/).value).toBe('3');
  expect(document.activeElement).toBe(screen.getByRole('group', { name: /^Runs of duct/ }));
  expect(inAddress('runs.1.length')).toBeNull();
});

it('takes over the units chosen in the bar and changes the numbers, not the question', async () => {
  open('duct-pressure', DUCT);
  document.documentElement.dataset.units = 'us';
  await waitFor(() => expect(field(/^Diameter/).value).toBe('4.9213'));
  await waitFor(
    () => expect(document.querySelector('[data-result="staticPressure"]')?.textContent).toMatch(/in. w.g./),
    {
      timeout: 3000,
    },
  );
  expect(JSON.parse(String(asked.mock.calls.at(-1)![1].body)).runs[0].diameter).toBeCloseTo(0.125, 5);
});

it('follows the reader at once where the address names no units, and not where it does', async () => {
  document.documentElement.dataset.units = 'us';
  open('duct-pressure', DUCT.replace('&units=si', ''), true);
  await waitFor(() => expect(field(/^Diameter/).value).toBe('4.9213'));
  cleanup();
  open('duct-pressure', DUCT);
  expect(field(/^Diameter/).value).toBe('125');
});

it('says so when no answer comes', async () => {
  asked.mockImplementationOnce(async () => new Response('{}', { status: 503 }));
  open('dilution', DILUTION);
  await userEvent.type(field(/^Limit/), '5');
  expect(await screen.findByText(/No answer came/)).toBeDefined();
});
