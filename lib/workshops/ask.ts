import { HOODS } from '@/lib/air/hood-airflow';
import { VENT_KINDS, VENTS } from '@/lib/air/vent-limits';
import type { Ask, FieldAsk, Option } from '@/lib/worksheets/ask/fields';
import { FEET, runsAsk } from '@/lib/worksheets/duct-ask';
import { curveAsk, speedAsk } from '@/lib/worksheets/fan-ask';
import { HOOD_WORDS } from '@/lib/worksheets/hood-airflow/names';

/** What the form offers besides fixed words: names written in it, and the processes and materials of the library. */
export type Offers = {
  rooms: string[];
  exhausts: string[];
  processes: readonly Option[];
  materials: readonly Option[];
};

const MILLIMETRES = { si: 'mm', us: 'in' };
const named = (names: string[]): Option[] =>
  [...new Set(names.filter(Boolean))].map((name) => ({ value: name, label: name }));

const roomFields: FieldAsk[] = [
  { path: 'name', as: 'text', label: 'name' },
  { path: 'volume', as: 'number', kind: 'volume', label: 'volume' },
  { path: 'height', as: 'number', kind: 'length', unit: FEET, label: 'height' },
  { path: 'ach50', as: 'number', label: 'air changes an hour at 50 Pa', help: 'Left out: 6, an assumption.' },
  { path: 'supply', as: 'number', kind: 'airflow', label: 'blown in by a fan' },
  {
    ...{ path: 'openings', as: 'rows', label: 'openings to outdoors that stay open', one: 'opening', min: 0, max: 8 },
    fields: [
      { path: 'area', as: 'number', kind: 'area', label: 'free area' },
      { path: 'height', as: 'number', kind: 'length', unit: FEET, label: 'height above the floor' },
    ],
  },
  {
    ...{
      path: 'appliances',
      as: 'rows',
      label: 'flued appliances in it or open to it',
      one: 'appliance',
      min: 0,
      max: 6,
    },
    fields: [
      { path: 'name', as: 'text', label: 'name' },
      {
        ...{ path: 'vent', as: 'choice', label: 'how its gas leaves', first: 'Choose' },
        options: VENTS.map((value) => ({ value, label: VENT_KINDS[value].name })),
      },
      { path: 'flueHeight', as: 'number', kind: 'length', unit: FEET, label: 'height of the flue' },
      { path: 'flueTemperature', as: 'number', kind: 'temperature', label: 'temperature in the flue' },
    ],
  },
];

const exhaustFields = (rooms: string[]): FieldAsk[] => [
  { path: 'name', as: 'text', label: 'name' },
  { path: 'room', as: 'choice', label: 'room', first: 'Choose', options: named(rooms) },
  { path: 'airflow', as: 'number', kind: 'airflow', label: 'its airflow, if no curve is at hand' },
  {
    path: 'entryLossFactor',
    as: 'number',
    label: 'entry loss factor F',
    help: 'Left out: by the kind of hood, an assumption.',
  },
  { ...curveAsk, min: 0, label: 'or the points of its fan’s curve' },
  speedAsk,
  { ...runsAsk, min: 0 },
  { path: 'filter.clean', as: 'number', kind: 'pressure', label: 'loss of its filter, clean' },
  { path: 'filter.loaded', as: 'number', kind: 'pressure', label: 'loss of its filter when changed' },
  { path: 'filter.at', as: 'number', kind: 'airflow', label: 'airflow that both are stated at' },
  { path: 'outletLossFactor', as: 'number', label: 'loss factor C of the outlet' },
];

const stationFields = ({ exhausts, processes }: Offers): FieldAsk[] => [
  { path: 'name', as: 'text', label: 'machine or bench' },
  { path: 'exhaust', as: 'choice', label: 'exhaust it is at', first: 'Choose', options: named(exhausts) },
  { path: 'process', as: 'choice', label: 'what is done there', first: 'Choose', options: processes },
  {
    ...{ path: 'hood', as: 'choice', label: 'its hood', first: 'Choose' },
    options: HOODS.map((value) => ({ value, label: HOOD_WORDS[value].name })),
  },
  { path: 'distance', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'distance of the work from the hood' },
  { path: 'diameter', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'diameter of a round hood' },
  { path: 'width', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'width, or length of a slot' },
  { path: 'height', as: 'number', kind: 'length', unit: MILLIMETRES, label: 'height' },
  { path: 'openArea', as: 'number', kind: 'area', label: 'open area of an enclosure, all gaps' },
  { path: 'perimeter', as: 'number', kind: 'length', unit: FEET, label: 'rim of the work under a canopy' },
  {
    ...{ ...runsAsk, min: 0, max: 4, label: 'its own duct, where several machines share a fan' },
    help: 'From this hood to where it meets the others; the duct of the exhaust is then the common one.',
  },
];

const readingFields = (exhausts: string[]): FieldAsk[] => [
  { path: 'exhaust', as: 'choice', label: 'exhaust', first: 'Choose', options: named(exhausts) },
  {
    ...{ path: 'kind', as: 'choice', label: 'what was read', first: 'Choose' },
    options: [
      { value: 'face-velocity', label: 'velocity at the face of the hood' },
      { value: 'static-pressure', label: 'static pressure at the tap behind it' },
    ],
  },
  { path: 'date', as: 'text', label: 'date, as 2026-12-01' },
  { path: 'who', as: 'text', label: 'who read it' },
  { path: 'velocity', as: 'number', kind: 'velocity', label: 'velocity' },
  { path: 'pressure', as: 'number', kind: 'pressure', label: 'suction' },
];

/** How a workshop is asked for, a group a step. */
export const workshopAsk = (offers: Offers): Ask => ({
  name: 'workshop',
  groups: [
    {
      title: 'The place',
      fields: [
        { path: 'name', as: 'text', label: 'name of the workshop' },
        {
          path: 'climate.indoor',
          as: 'number',
          kind: 'temperature',
          label: 'temperature indoors',
          help: 'Left out: 20 °C.',
        },
        {
          path: 'climate.outdoor',
          as: 'number',
          kind: 'temperature',
          label: 'temperature on a cold day',
          help: 'Left out: 0 °C.',
        },
        { path: 'climate.altitude', as: 'number', kind: 'length', unit: FEET, label: 'altitude' },
      ],
    },
    {
      title: 'The rooms',
      fields: [
        {
          path: 'rooms',
          as: 'rows',
          label: 'rooms, what is let in and what burns',
          one: 'room',
          min: 1,
          max: 8,
          fields: roomFields,
        },
      ],
    },
    {
      title: 'What takes air out',
      fields: [
        {
          path: 'exhausts',
          as: 'rows',
          label: 'exhausts',
          one: 'exhaust',
          min: 1,
          max: 12,
          fields: exhaustFields(offers.rooms),
        },
      ],
    },
    {
      title: 'Machines and benches',
      fields: [
        {
          path: 'stations',
          as: 'rows',
          label: 'stations',
          one: 'station',
          min: 1,
          max: 16,
          fields: stationFields(offers),
        },
      ],
    },
    {
      title: 'Usual materials',
      fields: [
        {
          ...{ path: 'materials', as: 'rows', label: 'materials', one: 'material', min: 0, max: 24 },
          fields: [{ path: 'material', as: 'choice', label: 'material', first: 'Choose', options: offers.materials }],
        },
      ],
    },
    {
      title: 'Upkeep',
      help: 'The first reading of each exhaust and kind is its baseline; later ones are held against it.',
      fields: [
        {
          path: 'checkEvery',
          as: 'number',
          label: 'months between two readings',
          help: 'Left out: 3, common practice without a source.',
        },
        {
          path: 'readings',
          as: 'rows',
          label: 'readings',
          one: 'reading',
          min: 0,
          max: 120,
          fields: readingFields(offers.exhausts),
        },
      ],
    },
  ],
});
