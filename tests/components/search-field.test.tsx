import '@testing-library/jest-dom/vitest';
import { cleanup, render, screen } from '@testing-library/react';
import { renderToString } from 'react-dom/server';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SearchField } from '@/components/layout/search-field';

const push = vi.hoisted(() => vi.fn());
vi.mock('next/navigation', () => ({ useRouter: () => ({ push }) }));

const HITS = [{ kind: 'material', slug: 'pvc', title: 'PVC', summary: '', url: '/materials/pvc' }];

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  document.body.replaceChildren();
});

describe('the search field of the bar', () => {
  it('is a plain form that needs no script', () => {
    render(<SearchField />);
    expect(screen.getByRole('search')).toHaveAttribute('action', '/search');
    expect(screen.getByRole('combobox')).toHaveAttribute('name', 'q');
    expect(screen.getByRole('combobox')).toHaveAttribute('maxlength', '200');
  });

  it('is reached by / from anywhere', async () => {
    render(<SearchField />);
    await userEvent.keyboard('/');
    expect(screen.getByRole('combobox')).toHaveFocus();
    expect(screen.getByRole('combobox')).toHaveValue('');
  });

  it('leaves / alone while something else is typed', async () => {
    render(
      <>
        <SearchField />
        <textarea aria-label="Other" />
      </>,
    );
    await userEvent.type(screen.getByLabelText('Other'), '1/2');
    expect(screen.getByLabelText('Other')).toHaveValue('1/2');
    expect(screen.getByLabelText('Other')).toHaveFocus();
  });

  it('goes straight to a suggestion that is taken', async () => {
    vi.stubGlobal('fetch', async () => Response.json({ hits: HITS }));
    render(<SearchField />);
    await userEvent.type(screen.getByRole('combobox'), 'pvc');
    await userEvent.click(await screen.findByRole('option'));
    expect(push).toHaveBeenCalledWith('/materials/pvc');
  });

  it('keeps what was typed before scripts arrived, and suggests for it', async () => {
    vi.stubGlobal('fetch', async () => Response.json({ hits: HITS }));
    const container = document.body.appendChild(document.createElement('div'));
    container.innerHTML = renderToString(<SearchField />);
    const field = screen.getByRole<HTMLInputElement>('combobox');
    field.focus();
    field.value = 'pvc she';
    render(<SearchField />, { container, hydrate: true });
    expect(await screen.findByRole('option')).toHaveTextContent('PVC');
    expect(screen.getByRole('combobox')).toBe(field);
    expect(field.value).toBe('pvc she');
  });
});
