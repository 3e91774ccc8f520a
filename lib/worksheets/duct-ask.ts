import { DUCT_KINDS, DUCTS } from '@/lib/air/duct-kind';
import { ENTRIES } from '@/lib/air/entry-loss';
import { FITTINGS } from '@/lib/air/fitting';
import { CIRCUMSTANCE_WORDS, CIRCUMSTANCES } from './circumstances';
import type { FieldAsk, GroupAsk, NumberAsk, RowsAsk } from './ask/fields';

const MILLIMETRES = { si: 'mm', us: 'in' };
export const FEET = { si: 'm', us: 'ft' };
const factors = ENTRIES.filter(({ code }) => !code.startsWith('tapered') || code === 'tapered-90')
  .map(({ name, factor }) => `${name} ${factor}`)
  .join('; ');

export const circumstances: GroupAsk = {
  title: 'Before the numbers: is any of this true?',
  fields: [
    {
      ...{ path: 'circumstances', as: 'checks', label: 'Tick what is true' },
      options: CIRCUMSTANCES.map((value) => ({ value, label: CIRCUMSTANCE_WORDS[value] })),
    },
  ],
};

export const airflowAsk: NumberAsk = { path: 'airflow', as: 'number', kind: 'airflow', label: 'airflow' };

export const hoodAsk: FieldAsk = {
  ...{ path: 'hood.entryLossFactor', as: 'number', label: 'entry loss factor F of the hood' },
  help: `By its shape: ${factors}.`,
};

export const runsAsk: RowsAsk = {
  ...{ path: 'runs', as: 'rows', label: 'runs of duct, from the hood on', one: 'run', min: 1, max: 12 },
  fields: [
    {
      ...{ path: 'duct', as: 'choice', label: 'kind of duct', first: 'Choose' },
      options: DUCTS.map((value) => ({ value, label: DUCT_KINDS[value].name })),
    },
    { path: 'diameter', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'diameter inside' },
    { path: 'length', as: 'number', kind: 'length', unit: FEET, label: 'length' },
    {
      path: 'compression',
      as: 'number',
      label: 'share a hose is pushed together',
      help: 'Hose only: 0 is stretched, 0.15 is 15 %.',
    },
    {
      ...{ path: 'fittings', as: 'rows', label: 'bends and fittings in this run', one: 'fitting', min: 0, max: 12 },
      fields: [
        {
          ...{ path: 'fitting', as: 'choice', label: 'fitting', first: 'Choose' },
          options: FITTINGS.map(({ code, name, k }) => ({
            value: code,
            label: k === undefined ? `${name} (give its C)` : `${name}, C ${k}`,
          })),
        },
        { path: 'count', as: 'number', label: 'how many' },
        { path: 'k', as: 'number', label: 'loss factor C, if you know it' },
      ],
    },
  ],
};

/** What some systems have besides: behind a click until it is filled in. */
export const moreDuct: GroupAsk = {
  title: 'Filter, outlet and air',
  folded: true,
  fields: [
    { path: 'filter.clean', as: 'number', kind: 'pressure', label: 'loss of the filter, clean' },
    { path: 'filter.loaded', as: 'number', kind: 'pressure', label: 'loss of the filter when it is changed' },
    { path: 'filter.at', as: 'number', kind: 'airflow', label: 'airflow that both are stated at' },
    {
      ...{ path: 'outlet.k', as: 'number', label: 'loss factor C of the outlet' },
      help: 'What it loses beyond an open end: weather cap one diameter above 0.1, three quarters 0.18, half 0.73 (from memory).',
    },
    { path: 'air.temperature', as: 'number', kind: 'temperature', label: 'temperature of the air in the duct' },
    { path: 'air.altitude', as: 'number', kind: 'length', unit: FEET, label: 'altitude of the shop' },
  ],
};
