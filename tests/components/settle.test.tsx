import { readFileSync } from 'node:fs';
import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ThemeSwitch } from '@/components/layout/theme-switch';
import { UnitsSwitch } from '@/components/layout/units-switch';

const SETTLE = readFileSync('public/settle.js', 'utf8');
/** As the browser does it for a script element. */
const settle = () => window.eval(SETTLE);
const root = document.documentElement;

beforeEach(() => localStorage.clear());
afterEach(() => {
  cleanup();
  delete root.dataset.units;
  delete root.dataset.theme;
});

describe('settle.js', () => {
  it('settles on SI and the system’s colours when nothing was chosen', () => {
    settle();
    expect({ ...root.dataset }).toEqual({ units: 'si', theme: 'system' });
  });

  it('settles on what was chosen before, and ticks it', () => {
    localStorage.setItem('fumelore.units', 'us');
    localStorage.setItem('fumelore.theme', 'dark');
    render(<UnitsSwitch />);
    settle();
    expect({ ...root.dataset }).toEqual({ units: 'us', theme: 'dark' });
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'US customary units' }).checked).toBe(true);
  });

  it('takes nothing from storage that is no choice', () => {
    localStorage.setItem('fumelore.units', '"><script>');
    settle();
    expect(root.dataset.units).toBe('si');
  });

  it('remembers a change', async () => {
    render(
      <>
        <UnitsSwitch />
        <ThemeSwitch />
      </>,
    );
    settle();
    await userEvent.click(screen.getByRole('radio', { name: 'US customary units' }));
    await userEvent.click(screen.getByRole('radio', { name: 'Light colours' }));
    expect({ ...root.dataset }).toEqual({ units: 'us', theme: 'light' });
    expect(localStorage.getItem('fumelore.units')).toBe('us');
    expect(localStorage.getItem('fumelore.theme')).toBe('light');
  });
});
