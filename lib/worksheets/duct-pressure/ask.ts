import { CARRIED, TRANSPORT } from '@/lib/air/transport-velocity';
import type { Ask } from '@/lib/worksheets/ask/fields';
import { airflowAsk, circumstances, hoodAsk, moreDuct, runsAsk } from '@/lib/worksheets/duct-ask';

export const ductPressureAsk: Ask = {
  name: 'duct-pressure',
  parts: ['hood'],
  groups: [
    circumstances,
    {
      title: 'The air and the hood',
      fields: [
        airflowAsk,
        hoodAsk,
        {
          ...{ path: 'carries', as: 'choice', label: 'what the duct carries', first: 'Not said' },
          options: CARRIED.map((value) => ({ value, label: TRANSPORT[value].name })),
        },
      ],
    },
    { title: 'The duct', fields: [runsAsk] },
    moreDuct,
  ],
};
