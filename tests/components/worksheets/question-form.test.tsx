import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { asks } from '@/components/worksheets/asked/live-results';
import { QuestionForm } from '@/components/worksheets/asked/question-form';
import type { FieldFault } from '@/lib/outcome';
import type { Ask } from '@/lib/worksheets/ask/fields';
import { typedOf } from '@/lib/worksheets/ask/request';
import { typedFrom } from '@/lib/worksheets/ask/typed';
import { EXAMPLES } from '@/lib/worksheets/examples';

afterEach(cleanup);

const open = (ask: Ask, query: string, faults: FieldFault[] = []) =>
  render(
    <QuestionForm
      {...{ ask, address: '/worksheets/it', listed: true }}
      state={{ typed: typedFrom(ask, new URLSearchParams(query)), faults }}
    />,
  ).container.querySelector('form')!;

describe.each(Object.entries(asks))('the form of %s', (name, ask) => {
  it('sends by itself what its example was filled in with', () => {
    const typed = typedOf(ask, EXAMPLES[name]!);
    const form = render(
      <QuestionForm {...{ ask, address: '/worksheets/it', listed: true }} state={{ typed, faults: [] }} />,
    ).container.querySelector('form')!;
    const sent = [...new FormData(form)].filter(([field, text]) => text !== '' && field !== 'units');
    const wanted = [...typed.texts].flatMap(([field, all]) => all.map((text) => [field, text]));
    expect(sent.sort()).toEqual(wanted.sort());
  });

  it('asks first what must be known before any number', () =>
    expect(open(ask, '').querySelector('fieldset legend')!.textContent).toMatch(/^Before the numbers/));

  it('names each control once, and gives no two things one id', () => {
    const form = open(
      ask,
      [...typedOf(ask, EXAMPLES[name]!).texts].map(([path, all]) => `${path}=${all[0]}`).join('&'),
    );
    const ids = [...form.querySelectorAll('[id]')].map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const control of form.querySelectorAll<HTMLInputElement>('input:not([type="hidden"]), select'))
      expect(control.labels!.length, control.name).toBe(1);
  });
});

describe('the form', () => {
  const duct = asks['duct-pressure'];

  it('says the unit beside a number, in the units that were chosen', () => {
    open(duct, 'units=si');
    expect(screen.getByRole('textbox', { name: 'Diameter inside (mm)' })).toBeDefined();
    cleanup();
    open(duct, 'units=us');
    expect(screen.getByRole('textbox', { name: 'Diameter inside (in)' })).toBeDefined();
  });

  it('sets a choice of a few open and one of many in a list, and within rows always in a list', () => {
    open(asks.exposure, 'basis=STEL');
    expect((screen.getByRole('radio', { name: /15 minutes/ }) as HTMLInputElement).checked).toBe(true);
    expect(screen.queryByRole('radio', { name: 'Choose' })).toBeNull();
    expect(screen.getByRole('combobox', { name: 'Its unit' })).toBeDefined();
    cleanup();
    open(duct, '');
    expect(screen.getByRole('combobox', { name: 'What the duct carries' })).toBeDefined();
    expect(screen.queryByRole('radio')).toBeNull();
  });

  it('reads a fault out with its field and leads to it from the list', () => {
    open(duct, 'runs.0.length=-8', [{ path: 'runs.0.length', message: 'Length must be at least 0.' }]);
    const field = screen.getByRole('textbox', { name: 'Length (m)' });
    const described = field.getAttribute('aria-describedby')!.split(' ');
    expect(described.map((id) => document.getElementById(id)!.textContent)).toContain('Length must be at least 0.');
    const line = within(screen.getByRole('alert')).getByRole('link', { name: 'Run 1: Length must be at least 0.' });
    expect(line.getAttribute('href')).toBe(`#${field.id}`);
  });

  it('puts rows within rows, each in a box with its number, and takes away none that must be', () => {
    const form = open(duct, 'runs.0.duct=smooth-plastic&runs.1.fittings.1.count=2');
    const second = within(screen.getByRole('group', { name: 'Run 2' }));
    expect(second.getAllByRole('group', { name: /^Fitting \d$/ })).toHaveLength(2);
    const buttons = [...form.querySelectorAll<HTMLButtonElement>('button[name="remove"]')].map(({ value }) => value);
    expect(buttons).toEqual(['runs.0', 'runs.1.fittings.0', 'runs.1.fittings.1', 'runs.1']);
    cleanup();
    expect(open(duct, '').querySelector('button[name="remove"]')).toBeNull();
  });

  it('comes back, without scripts, to the rows that a button changed', () => {
    const form = open(duct, 'runs.1.fittings.0.count=2');
    const landing = (selector: string) => form.querySelector(selector)!.getAttribute('formaction')!;
    expect(landing('button[name="add"][value="runs"]')).toBe('#field-runs');
    expect(landing('button[name="remove"][value="runs.1.fittings.0"]')).toBe('#field-runs-1-fittings');
    for (const button of form.querySelectorAll('button[formaction]'))
      expect(form.querySelector(button.getAttribute('formaction')!)!.tagName).toBe('FIELDSET');
  });

  it('sends the question, and no row button, when Enter is pressed in a field', () =>
    expect(open(duct, '').querySelector('button')!.textContent).toBe('Reckon'));

  it('opens what is folded where something in it is filled in', () => {
    const opened = (query: string) => [...open(duct, query).querySelectorAll('details')].map(({ open: is }) => is);
    expect(opened('')).toEqual([false]);
    cleanup();
    expect(opened('outlet.k=0.1')).toEqual([true]);
  });
});
