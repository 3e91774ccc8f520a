import '@testing-library/jest-dom/vitest';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { SWRConfig } from 'swr';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Combobox } from '@/components/forms/combobox';
import type { LoadSuggestions, Suggestion } from '@/components/forms/suggestion';

const WOODS: Suggestion[] = ['Birch', 'Beech', 'Balsa'].map((text) => ({ key: text, text }));
const onSubmit = vi.fn((event: React.FormEvent) => event.preventDefault());
const onChoose = vi.fn();

beforeEach(() => {
  onSubmit.mockClear();
  onChoose.mockClear();
});
afterEach(cleanup);

function show(load: LoadSuggestions | string = async () => WOODS) {
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <form onSubmit={onSubmit}>
        <label htmlFor="wood">Wood</label>
        <Combobox id="wood" name="wood" listLabel="Woods" from={load} onChoose={onChoose} />
      </form>
    </SWRConfig>,
  );
  return screen.getByRole<HTMLInputElement>('combobox', { name: 'Wood' });
}

async function opened(load?: LoadSuggestions) {
  const user = userEvent.setup();
  const field = show(load);
  await user.type(field, 'bi');
  await screen.findAllByRole('option');
  return { user, field };
}

const marked = (field: HTMLElement) =>
  document.getElementById(field.getAttribute('aria-activedescendant') ?? '')?.textContent ?? null;

describe('the list of a combobox', () => {
  it('opens as one types, with nothing marked, and says how many there are', async () => {
    const { field } = await opened();
    expect(field).toHaveAttribute('aria-expanded', 'true');
    expect(marked(field)).toBeNull();
    expect(screen.getByRole('listbox', { name: 'Woods' })).toBeVisible();
    await waitFor(() => expect(screen.getByRole('status')).toHaveTextContent('3 suggestions'));
  });

  it('is gone round by the arrow keys, by way of the field', async () => {
    const { user, field } = await opened();
    const seen = [];
    for (const key of ['ArrowDown', 'ArrowDown', 'ArrowDown', 'ArrowDown', 'ArrowUp', 'ArrowUp']) {
      await user.keyboard(`{${key}}`);
      seen.push(marked(field));
    }
    expect(seen).toEqual(['Birch', 'Beech', 'Balsa', null, 'Balsa', 'Beech']);
    expect(screen.getByRole('option', { selected: true })).toHaveTextContent('Beech');
    expect(field).toHaveFocus();
  });

  it('gives its marked line to the field on Enter, and the form waits', async () => {
    const { user, field } = await opened();
    await user.keyboard('{ArrowDown}{Enter}');
    expect(field.value).toBe('Birch');
    expect(onChoose).toHaveBeenCalledWith(WOODS[0]);
    expect(field).toHaveAttribute('aria-expanded', 'false');
    expect(onSubmit).not.toHaveBeenCalled();
  });

  it('lets Enter send the form when nothing is marked', async () => {
    const { user, field } = await opened();
    await user.keyboard('{Enter}');
    expect(onSubmit).toHaveBeenCalledOnce();
    expect(field.value).toBe('bi');
  });

  it('closes on Escape and keeps what was typed', async () => {
    const { user, field } = await opened();
    await user.keyboard('{ArrowDown}{Escape}');
    expect(field).toHaveAttribute('aria-expanded', 'false');
    expect(field.value).toBe('bi');
    await user.keyboard('{ArrowDown}');
    expect(marked(field)).toBe('Birch');
  });

  it.each(['Home', 'End', 'ArrowLeft'])('gives %s back to the caret', async (key) => {
    const { user, field } = await opened();
    await user.keyboard(`{ArrowDown}{${key}}`);
    expect(marked(field)).toBeNull();
    expect(field.selectionStart).toBe(key === 'Home' ? 0 : key === 'End' ? 2 : 1);
  });

  it('opens on Alt and down without marking, and closes on Alt and up', async () => {
    const { user, field } = await opened();
    await user.keyboard('{Escape}{Alt>}{ArrowDown}{/Alt}');
    expect(field).toHaveAttribute('aria-expanded', 'true');
    expect(marked(field)).toBeNull();
    await user.keyboard('{Alt>}{ArrowUp}{/Alt}');
    expect(field).toHaveAttribute('aria-expanded', 'false');
  });

  it('closes when the focus leaves', async () => {
    const { user, field } = await opened();
    await user.tab();
    expect(field).toHaveAttribute('aria-expanded', 'false');
  });

  it('takes a click without losing the focus of the field', async () => {
    const { user, field } = await opened();
    await user.click(screen.getByRole('option', { name: 'Beech' }));
    expect(field.value).toBe('Beech');
    expect(field).toHaveFocus();
  });
});

describe('what a combobox asks for', () => {
  it('is the text after a pause, not each letter', async () => {
    const load = vi.fn(async () => WOODS);
    await opened(load);
    expect(load.mock.calls.map(([text]: unknown[]) => text)).toEqual(['bi']);
  });

  it('is dropped when a later text overtakes it', async () => {
    const signals: AbortSignal[] = [];
    const load: LoadSuggestions = (text, signal) => {
      signals.push(signal);
      return text === 'bi' ? new Promise(() => undefined) : Promise.resolve(WOODS);
    };
    const user = userEvent.setup();
    const field = show(load);
    await user.type(field, 'bi');
    await waitFor(() => expect(signals).toHaveLength(1));
    await user.type(field, 'r');
    await screen.findAllByRole('option');
    expect(signals.map((signal) => signal.aborted)).toEqual([true, false]);
  });

  it('may fail without hurting the form', async () => {
    const user = userEvent.setup();
    const load = vi.fn(() => Promise.reject(new Error('offline')));
    const field = show(load);
    await user.type(field, 'bi');
    await waitFor(() => expect(load).toHaveBeenCalled());
    await user.keyboard('{Enter}');
    expect(onSubmit).toHaveBeenCalledOnce();
  });

  it('comes from an address as the search answers it, a pair first', async () => {
    const pair = { materials: ['pvc'], process: 'laser-cutting', control: 'prohibited', url: '/check?material=pvc' };
    const hits = [
      { kind: 'material', slug: 'pvc', title: 'PVC', summary: '', url: '/materials/pvc', control: 'prohibited' },
    ];
    const fetched = vi.fn(async () => Response.json({ hits, pair }));
    vi.stubGlobal('fetch', fetched);
    await userEvent.type(show('/api/search?limit=8'), 'laser & pvc');
    const options = await screen.findAllByRole('option');
    expect(options.map((option) => option.textContent)).toEqual([
      'pvc × laser cuttingCheck Prohibited',
      'PVCMaterial Prohibited',
    ]);
    expect(fetched).toHaveBeenCalledWith('/api/search?limit=8&q=laser%20%26%20pvc', expect.anything());
    vi.unstubAllGlobals();
  });
});
