import { z } from 'zod';
import { HOODS, type HoodName } from '@/lib/air/hood-airflow';
import { SYSTEMS, type Kind } from '@/lib/units/kinds';
import { MAX_TYPED } from '@/lib/units/parse-quantity';
import { toldBoth } from '@/lib/units/show';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { FIELDS_OF, NUMBERS, WORK, type NumberField } from './fields';

/** Limits on a question, SI. Wide enough for a spray booth or a long tank, and no wider: beyond them the equations say nothing. */
export const MIN_VELOCITY = 0.01;
export const MAX_VELOCITY = 25;
export const MIN_LENGTH = 0.001;
export const MAX_LENGTH = 20;
export const MIN_AREA = 0.000_01;
export const MAX_AREA = 400;
export const MAX_PERIMETER = 80;

const between = (kind: Kind, min: number, max: number) =>
  z
    .number()
    .min(min, `must be at least ${min === 0 ? '0' : toldBoth(kind, min)}`)
    .max(max, `must be at most ${toldBoth(kind, max)}`);
const length = (min = MIN_LENGTH, max = MAX_LENGTH) => between('length', min, max);

const fields = z.strictObject({
  hood: z.enum(HOODS),
  velocity: between('velocity', MIN_VELOCITY, MAX_VELOCITY).describe(
    'm/s: wanted at the source; through the openings of an enclosure; of the air curtain of a canopy',
  ),
  distance: length(0).optional().describe('m, from the hood to the source; height of a canopy above the work'),
  diameter: length().optional().describe('m, of a round opening'),
  width: length().optional().describe('m, of a rectangular opening; the length of a slot'),
  height: length().optional().describe('m, of a rectangular opening or a slot'),
  openArea: between('area', MIN_AREA, MAX_AREA).optional().describe('m2, all openings of an enclosure together'),
  perimeter: length(MIN_LENGTH, MAX_PERIMETER).optional().describe('m, of the work under a canopy'),
  work: z.array(z.enum(WORK)).max(WORK.length).optional().describe('what is true of the work and changes the warnings'),
});

type Fields = z.infer<typeof fields>;
type Fault = [NumberField, string];

const named = (hood: HoodName) => `${/^[aeiou]/.test(hood) ? 'an' : 'a'} ${hood.replace('-', ' ')}`;

function faultsOfFace(question: Fields): Fault[] {
  const { hood, diameter, width = 0, height = 0 } = question;
  if (!FIELDS_OF[hood].includes('height')) return [];
  const sides = (['width', 'height'] as const).filter((side) => question[side] === undefined);
  if (diameter !== undefined)
    return sides.length === 2 ? [] : [['diameter', 'give a diameter, or width and height, not both']];
  if (sides.length === 2 && FIELDS_OF[hood].includes('diameter'))
    return [['diameter', `is missing: ${named(hood)} needs a diameter, or width and height`]];
  if (sides.length === 0 && !FIELDS_OF[hood].includes('diameter') && height > width)
    return [['height', 'is more than the width: the width of a slot is its length']];
  return sides.map((side) => [side, `is missing: ${named(hood)} needs width and height`]);
}

function faultsOf(question: Fields): Fault[] {
  const { hood, distance } = question;
  const used = FIELDS_OF[hood];
  const idle = NUMBERS.filter((field) => question[field] !== undefined && !used.includes(field));
  const missing = (['distance', 'openArea', 'perimeter'] as const).filter(
    (field) => used.includes(field) && question[field] === undefined,
  );
  const atOnce =
    distance !== undefined && distance < MIN_LENGTH && !used.includes('diameter') && used.includes('distance');
  return [
    ...idle.map((field): Fault => [field, `${named(hood)} is not reckoned from this: leave it out`]),
    ...missing.map((field): Fault => [field, `is missing: ${named(hood)} needs it`]),
    ...(atOnce ? [['distance', `must be at least ${toldBoth('length', MIN_LENGTH)}`] satisfies Fault] : []),
    ...(idle.length > 0 ? [] : faultsOfFace(question)),
  ];
}

/** Sizes are looked at as soon as the hood is known, also beside other faults, so that one answer names them all. */
const knowsHood = (value: unknown) =>
  typeof value === 'object' && value !== null && 'hood' in value && (HOODS as readonly unknown[]).includes(value.hood);

/** A question to the hood worksheet, as it comes over the wire. */
export const hoodAirflowRequest = fields
  .superRefine(
    (question, context) => {
      for (const [field, message] of faultsOf(question)) context.addIssue({ code: 'custom', path: [field], message });
    },
    { when: ({ value }) => knowsHood(value) },
  )
  .meta({
    id: 'HoodAirflowRequest',
    examples: [{ hood: 'flanged-opening', velocity: 0.5, distance: 0.3, diameter: 0.2 }],
  });

export type HoodQuestion = z.infer<typeof hoodAirflowRequest>;

const typed = z.string().max(MAX_TYPED).optional().describe('a number, with or without its unit');

/** The same question as it stands in the address of the page. */
export const hoodAirflowAddress = z.object({
  hood: z.enum(HOODS),
  ...Object.fromEntries(NUMBERS.map((field) => [field, typed])),
  work: z.array(z.enum(WORK)).optional(),
  units: z.enum(SYSTEMS).optional().describe('of bare numbers: SI unless told'),
});

export const hoodAirflowResult = z.strictObject({
  airflow: z.number().describe('m3/s the hood must draw'),
  faceVelocity: z.number().describe('m/s, mean through the opening; for a canopy through its open sides'),
  contour: z
    .array(z.strictObject({ distance: z.number(), velocity: z.number() }))
    .describe(
      'm and m/s at this airflow: out from the hood; for a canopy at other heights; for an enclosure at its openings only',
    ),
});

export type HoodResult = z.infer<typeof hoodAirflowResult>;
export const hoodAirflowAnswer = answerOf(hoodAirflowResult).meta({ id: 'HoodAirflowAnswer' });
