import type { Ask } from '@/lib/worksheets/ask/fields';
import { CONCENTRATIONS } from '@/lib/worksheets/dilution/ask';
import { circumstances } from '@/lib/worksheets/duct-ask';

export const BASIS_OPTIONS = [
  { value: 'TWA', label: 'average of a shift (TWA)' },
  { value: 'STEL', label: '15 minutes (STEL)' },
  { value: 'ceiling', label: 'never to be passed (ceiling)' },
  { value: 'IDLH', label: 'danger to life at once (IDLH)' },
];

export const exposureAsk: Ask = {
  name: 'exposure',
  groups: [
    circumstances,
    {
      title: 'What was measured',
      fields: [
        {
          ...{ path: 'items', as: 'rows', label: 'substances in the air together', one: 'substance', min: 1, max: 12 },
          fields: [
            {
              path: 'substance',
              as: 'text',
              label: 'substance, as its address in the library',
              help: 'Such as toluene.',
            },
            { path: 'value', as: 'number', label: 'concentration' },
            { path: 'unit', as: 'choice', label: 'its unit', first: 'Choose', options: CONCENTRATIONS },
          ],
        },
      ],
    },
    {
      title: 'Against which limit',
      fields: [
        { path: 'basis', as: 'choice', label: 'over what time', first: 'Choose', options: BASIS_OPTIONS },
        {
          path: 'authority',
          as: 'text',
          label: 'whose limit',
          help: 'Such as OSHA, NIOSH or HSE; the strictest in force where left out.',
        },
      ],
    },
  ],
};
