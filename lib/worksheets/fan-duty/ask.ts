import type { Ask, FieldAsk } from '@/lib/worksheets/ask/fields';
import { circumstances, hoodAsk, moreDuct, runsAsk } from '@/lib/worksheets/duct-ask';
import { curveAsk, speedAsk } from '@/lib/worksheets/fan-ask';

const branches: FieldAsk = {
  ...{ path: 'branches', as: 'rows', label: 'machines on this fan', one: 'machine', min: 0, max: 8 },
  fields: [
    { path: 'name', as: 'text', label: 'name' },
    hoodAsk,
    {
      ...{ path: 'gate', as: 'choice', label: 'its gate', first: 'Open' },
      options: [
        { value: 'open', label: 'open' },
        { value: 'shut', label: 'shut' },
      ],
    },
    { path: 'wanted', as: 'number', kind: 'airflow', label: 'airflow it needs' },
    { ...runsAsk, max: 4 },
  ],
};

export const fanDutyAsk: Ask = {
  name: 'fan-duty',
  parts: ['hood'],
  groups: [
    circumstances,
    { title: 'The fan', fields: [curveAsk, speedAsk] },
    { title: 'The hood and the duct', fields: [hoodAsk, runsAsk] },
    moreDuct,
    {
      ...{ title: 'The room and the airflow you want', folded: true },
      fields: [
        {
          ...{ path: 'roomPressure', as: 'number', kind: 'pressure', label: 'pressure of the room against outdoors' },
          help: 'Below outdoors with a minus: −5.',
        },
        { path: 'targetAirflow', as: 'number', kind: 'airflow', label: 'airflow you want' },
      ],
    },
    {
      ...{ title: 'Several machines on this fan', folded: true, fields: [branches] },
      help: 'Each with its hood and its own duct up to where they meet. The duct above is then the common one, without a hood.',
    },
  ],
};
