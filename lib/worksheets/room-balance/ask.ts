import { VENT_KINDS, VENTS } from '@/lib/air/vent-limits';
import type { Ask, FieldAsk } from '@/lib/worksheets/ask/fields';
import { circumstances, FEET, hoodAsk, runsAsk } from '@/lib/worksheets/duct-ask';
import { curveAsk, speedAsk } from '@/lib/worksheets/fan-ask';

const exhausts: FieldAsk = {
  ...{ path: 'exhausts', as: 'rows', label: 'everything that blows air out', one: 'exhaust', min: 1, max: 20 },
  help: 'Cooker hoods, bathroom fans and tumble dryers of rooms open to this one too.',
  fields: [
    { path: 'name', as: 'text', label: 'name' },
    { path: 'airflow', as: 'number', kind: 'airflow', label: 'its airflow, if no curve is at hand' },
    { ...curveAsk, min: 0, label: 'or the points of its curve' },
    speedAsk,
    hoodAsk,
    { ...runsAsk, min: 0 },
  ],
};

const openings: FieldAsk = {
  ...{ path: 'makeUp.openings', as: 'rows', label: 'openings that stay open', one: 'opening', min: 0, max: 12 },
  fields: [
    { path: 'area', as: 'number', kind: 'area', label: 'free area' },
    { path: 'height', as: 'number', kind: 'length', unit: FEET, label: 'height of its middle above the floor' },
    { path: 'dischargeCoefficient', as: 'number', label: 'discharge coefficient', help: '0.6 unless you know better.' },
  ],
};

const appliances: FieldAsk = {
  ...{
    path: 'appliances',
    as: 'rows',
    label: 'flued appliances in this room or open to it',
    one: 'appliance',
    min: 0,
    max: 8,
  },
  fields: [
    { path: 'name', as: 'text', label: 'name' },
    {
      ...{ path: 'vent', as: 'choice', label: 'how its gas leaves', first: 'Choose' },
      options: VENTS.map((value) => ({ value, label: VENT_KINDS[value].name })),
    },
    { path: 'flueHeight', as: 'number', kind: 'length', unit: FEET, label: 'height of the flue' },
    {
      path: 'flueTemperature',
      as: 'number',
      kind: 'temperature',
      label: 'temperature in the flue',
      help: 'Left out: a cold flue, as it has to start.',
    },
  ],
};

export const roomBalanceAsk: Ask = {
  name: 'room-balance',
  parts: ['room', 'air', 'makeUp'],
  groups: [
    circumstances,
    {
      title: 'The room',
      fields: [
        { path: 'room.volume', as: 'number', kind: 'volume', label: 'volume' },
        { path: 'room.height', as: 'number', kind: 'length', unit: FEET, label: 'height' },
        { path: 'air.indoor', as: 'number', kind: 'temperature', label: 'temperature indoors' },
        { path: 'air.outdoor', as: 'number', kind: 'temperature', label: 'temperature outdoors' },
        { path: 'air.altitude', as: 'number', kind: 'length', unit: FEET, label: 'altitude' },
      ],
    },
    { title: 'What leaves', fields: [exhausts] },
    {
      title: 'What is let in',
      fields: [
        { path: 'makeUp.supply', as: 'number', kind: 'airflow', label: 'blown in by a fan' },
        openings,
        { path: 'makeUp.leakage.areaAt4Pa', as: 'number', kind: 'area', label: 'leakage area at 4 Pa' },
        {
          path: 'makeUp.leakage.ach50',
          as: 'number',
          label: 'or air changes an hour at 50 Pa',
          help: 'Tight 1 to 3, ordinary 5 to 10, leaky 15 and more (from memory).',
        },
      ],
    },
    { title: 'What burns', fields: [appliances] },
  ],
};
