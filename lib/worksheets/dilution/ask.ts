import type { Ask } from '@/lib/worksheets/ask/fields';
import { circumstances } from '@/lib/worksheets/duct-ask';

export const CONCENTRATIONS = [
  { value: 'ppm', label: 'ppm' },
  { value: 'mg/m3', label: 'mg/m³' },
];

export const dilutionAsk: Ask = {
  name: 'dilution',
  parts: ['generation', 'limit'],
  groups: [
    circumstances,
    {
      title: 'What is given off',
      help: 'A release in mg/s, or a liquid that evaporates: one of the two.',
      fields: [
        { path: 'generation.massRate', as: 'number', label: 'release, in mg/s' },
        { path: 'generation.liquidRate', as: 'number', label: 'liquid that evaporates, in L/h' },
        {
          path: 'generation.specificGravity',
          as: 'number',
          label: 'specific gravity of the liquid',
          help: 'Water is 1.',
        },
        { path: 'generation.molarMass', as: 'number', label: 'molar mass of the liquid, in g/mol' },
      ],
    },
    {
      title: 'What it is to stay below',
      fields: [
        { path: 'limit.value', as: 'number', label: 'limit' },
        { path: 'limit.unit', as: 'choice', label: 'its unit', first: 'Choose', options: CONCENTRATIONS },
        { path: 'molarMass', as: 'number', label: 'molar mass, in g/mol', help: 'Needed for a limit in ppm.' },
        {
          path: 'mixingFactor',
          as: 'number',
          label: 'mixing factor K',
          help: '1 is perfect, which no room has; as high as 10 where air moves very poorly (CDC, 1994). Where other tables have a share of at most 1, do not type it here.',
        },
      ],
    },
  ],
};
