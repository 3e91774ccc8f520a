import type { Ask } from '@/lib/worksheets/ask/fields';
import { circumstances } from '@/lib/worksheets/duct-ask';

const MILLIMETRES = { si: 'mm', us: 'in' };

export const releaseAsk: Ask = {
  name: 'release',
  groups: [
    circumstances,
    {
      title: 'What is heated',
      fields: [
        {
          path: 'material',
          as: 'text',
          label: 'material, as its address in the library',
          help: 'Such as pvc, acrylic or acetal.',
        },
        { path: 'formula', as: 'text', label: 'or the formula of its repeat unit', help: 'Such as C2H3Cl.' },
      ],
    },
    {
      title: 'How much of it goes up',
      help: 'The mass, or the cut it was: one of the two.',
      fields: [
        { path: 'massLost', as: 'number', label: 'mass lost, in g' },
        { path: 'cut.length', as: 'number', kind: 'length', label: 'length of the cut' },
        { path: 'cut.kerf', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'width of the kerf' },
        { path: 'cut.thickness', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'thickness' },
        {
          path: 'cut.density',
          as: 'number',
          label: 'density, in kg/m³',
          help: 'The library’s highest, where left out.',
        },
      ],
    },
    {
      title: 'Into what room',
      fields: [
        { path: 'room.volume', as: 'number', kind: 'volume', label: 'volume' },
        { path: 'room.airflow', as: 'number', kind: 'airflow', label: 'airflow through it' },
      ],
    },
  ],
};
