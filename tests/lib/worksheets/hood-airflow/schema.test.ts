import { describe, expect, it } from 'vitest';
import { hoodAirflow } from '@/lib/worksheets/hood-airflow/about';
import {
  MAX_AREA,
  MAX_LENGTH,
  MAX_PERIMETER,
  MAX_VELOCITY,
  MIN_AREA,
  MIN_LENGTH,
  MIN_VELOCITY,
} from '@/lib/worksheets/hood-airflow/schema';

const opening = { hood: 'flanged-opening', velocity: 0.5, distance: 0.3, diameter: 0.2 };
const slot = { hood: 'plain-slot', velocity: 0.5, distance: 0.3, width: 0.5, height: 0.05 };
const enclosure = { hood: 'enclosure', velocity: 0.5, openArea: 0.06 };
const canopy = { hood: 'canopy', velocity: 0.5, distance: 0.3, perimeter: 2 };

const statusOf = (body: unknown) => {
  const answer = hoodAirflow.run(body);
  return answer.ok ? 200 : answer.status;
};
const faultsOf = (body: unknown) => {
  const answer = hoodAirflow.run(body);
  return answer.ok ? [] : answer.errors!.map(({ path, message }) => `${path}: ${message}`);
};

describe('a question that is not understood is malformed', () => {
  it.each([
    ['no object', 3, ': must be a JSON object'],
    ['an array', [opening], ': must be a JSON object'],
    ['nothing', null, ': must be a JSON object'],
    ['an unknown field', { ...opening, colour: 'red' }, 'colour: is not a field of this worksheet'],
    [
      'a field named __proto__',
      JSON.parse('{"hood":"enclosure","velocity":1,"openArea":1,"__proto__":{}}'),
      '__proto__',
    ],
    ['a number as text', { ...opening, velocity: '0.5' }, 'velocity: must be a JSON number'],
    ['a number for a hood', { ...opening, hood: 3 }, 'hood: must be one of'],
    ['null for a number', { ...opening, distance: null }, 'distance: must be a JSON number'],
    ['an array for a number', { ...opening, diameter: [0.2] }, 'diameter: must be a JSON number'],
    ['text for the work', { ...opening, work: 'hot' }, 'work: must be a JSON array'],
  ])('%s', (_, body, fault) => {
    expect(statusOf(body)).toBe(400);
    expect(faultsOf(body).join()).toContain(fault);
  });
});

describe('a question that is understood and cannot be is impossible', () => {
  it.each([
    ['nothing asked', {}, 'hood: is missing: one of plain-opening'],
    ['a hood there is not', { ...opening, hood: 'tube' }, 'hood: must be one of: plain-opening'],
    ['no velocity', { ...opening, velocity: undefined }, 'velocity: is missing'],
    ['a negative velocity', { ...opening, velocity: -0.5 }, 'velocity: must be at least 0.01\u00a0m/s (1.97\u00a0fpm)'],
    ['a velocity of zero', { ...opening, velocity: 0 }, 'velocity: must be at least'],
    ['an endless velocity', { ...opening, velocity: 1e999 }, 'velocity: must be a finite number'],
    ['a negative distance', { ...opening, distance: -0.3 }, 'distance: must be at least 0'],
    [
      'an opening without a distance',
      { ...opening, distance: undefined },
      'distance: is missing: a flanged opening needs it',
    ],
    ['an opening without a size', { ...opening, diameter: undefined }, 'diameter: is missing'],
    ['an opening of half a size', { ...opening, diameter: undefined, width: 0.2 }, 'height: is missing'],
    [
      'an opening of two sizes',
      { ...opening, width: 0.2, height: 0.2 },
      'diameter: give a diameter, or width and height, not both',
    ],
    ['a slot with a diameter', { ...slot, diameter: 0.2 }, 'diameter: a plain slot is not reckoned from this'],
    ['a slot without a height', { ...slot, height: undefined }, 'height: is missing'],
    ['a slot higher than long', { ...slot, width: 0.05, height: 0.5 }, 'height: is more than the width'],
    ['a slot at no distance', { ...slot, distance: 0 }, 'distance: must be at least'],
    [
      'an enclosure without its openings',
      { ...enclosure, openArea: undefined },
      'openArea: is missing: an enclosure needs it',
    ],
    [
      'an enclosure with a distance',
      { ...enclosure, distance: 0.3 },
      'distance: an enclosure is not reckoned from this',
    ],
    ['a canopy without a perimeter', { ...canopy, perimeter: undefined }, 'perimeter: is missing'],
    ['a canopy on the work itself', { ...canopy, distance: 0 }, 'distance: must be at least'],
    ['work there is not', { ...opening, work: ['hot', 'cold'] }, 'work.1: must be one of'],
  ])('%s', (_, body, fault) => {
    expect(faultsOf(body).join()).toContain(fault);
    expect(statusOf(body)).toBe(422);
  });
});

describe('the limits of a question hold to the last step', () => {
  it.each([
    ['velocity', opening, MIN_VELOCITY, MAX_VELOCITY],
    ['distance', opening, 0, MAX_LENGTH],
    ['distance', slot, MIN_LENGTH, MAX_LENGTH],
    ['diameter', opening, MIN_LENGTH, MAX_LENGTH],
    ['openArea', enclosure, MIN_AREA, MAX_AREA],
    ['perimeter', canopy, MIN_LENGTH, MAX_PERIMETER],
  ] as const)('%s of a %o', (field, question, min, max) => {
    for (const inside of [min, max]) expect(statusOf({ ...question, [field]: inside })).toBe(200);
    for (const outside of [min - 1e-9, max + 1e-9]) expect(statusOf({ ...question, [field]: outside })).toBe(422);
  });
});

it('names every fault at once', () => {
  expect(faultsOf({ hood: 'plain-slot', velocity: -1 }).map((fault) => fault.split(':')[0])).toEqual([
    ...['velocity', 'distance', 'width', 'height'],
  ]);
  expect(faultsOf({ hood: 'canopy', velocity: '1', colour: 1 }).map((fault) => fault.split(':')[0])).toEqual([
    ...['velocity', 'colour', 'distance', 'perimeter'],
  ]);
});

it('admits every kind of hood', () => {
  for (const question of [opening, slot, enclosure, canopy]) expect(statusOf(question)).toBe(200);
  expect(statusOf({ ...opening, distance: 0 })).toBe(200);
});
