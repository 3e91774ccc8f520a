import type { Ask } from '@/lib/worksheets/ask/fields';
import { circumstances } from '@/lib/worksheets/duct-ask';

export const clearingTimeAsk: Ask = {
  name: 'clearing-time',
  groups: [
    circumstances,
    {
      title: 'The room',
      fields: [
        { path: 'volume', as: 'number', kind: 'volume', label: 'volume' },
        { path: 'airflow', as: 'number', kind: 'airflow', label: 'airflow through it' },
        {
          path: 'cleanAir',
          as: 'number',
          kind: 'airflow',
          label: 'clean air of a filter (CADR)',
          help: 'Only for what that filter holds back. Leave empty without one.',
        },
        {
          path: 'mixingFactor',
          as: 'number',
          label: 'mixing factor K',
          help: '1 is perfect, which no room has; as high as 10 where air moves very poorly (CDC, 1994). Where other tables have a share of at most 1, do not type it here.',
        },
      ],
    },
    {
      title: 'How clear?',
      help: 'A share that is to go, or a concentration and the one to reach, or a source and how long it ran: one of the three.',
      fields: [
        { path: 'removal', as: 'number', label: 'share that is to be gone', help: '0.99 is 99 %.' },
        { path: 'from', as: 'number', label: 'from this concentration' },
        { path: 'to', as: 'number', label: 'to this one', help: 'In one unit, ppm or mg/m³; after a source in mg/m³.' },
        { path: 'massRate', as: 'number', label: 'release of the source, in mg/s' },
        { path: 'duration', as: 'number', label: 'seconds that it ran' },
      ],
    },
  ],
};
