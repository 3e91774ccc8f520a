import { z } from 'zod';
import { BASES, FORMS, HOODS, PROVENANCES } from './vocabulary';

/** Limits on what may be typed; each is tested at n-1, n and n+1. */
export const MAX_TITLE = 90;
export const MAX_LINE = 600;
export const MAX_ITEMS = 80;

const FORBIDDEN = /[\p{Cc}\p{Cs}\u200b-\u200f\u202a-\u202e\u2060-\u2069\ufeff]/u;

/** One line of text: NFC, no control or direction characters. */
export const line = (max = MAX_LINE) =>
  z
    .string()
    .min(1, 'must not be empty')
    .max(max, `must be at most ${max} characters`)
    .refine((text) => text === text.normalize('NFC'), 'must be in Unicode normal form C')
    .refine((text) => !FORBIDDEN.test(text), 'holds a control or direction character')
    .refine((text) => text.trim() === text, 'must not begin or end with a space');

export const slug = z
  .string()
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'must be lower-case words joined by hyphens')
  .max(60);

export const number = z
  .string()
  .regex(/^-?\d+(\.\d+)?(e-?\d+)?$/, 'must be a plain number')
  .transform(Number)
  .refine(Number.isFinite, 'must be finite');

export const integer = z
  .string()
  .regex(/^\d{1,4}$/, 'must be a whole number')
  .transform(Number);
export const lines = z.array(line()).max(MAX_ITEMS);
export const provenance = z.enum(PROVENANCES);
export const citations = z.array(slug).max(12);

/** Where a value comes from. A published value names its source; the others need none. */
export const sourced = {
  source: slug.optional(),
  provenance,
  note: line().optional(),
};
type Sourced = { source?: string; sources?: string[]; provenance: string };
const SOURCED = 'a published value must name its source';
export const isSourced = (value: Sourced) =>
  value.provenance !== 'published' || Boolean(value.source) || Boolean(value.sources?.length);

/** A measured or stated quantity: one value, or a range. */
export const quantity = (units: [string, ...string[]]) =>
  z
    .strictObject({
      value: number.optional(),
      min: number.optional(),
      max: number.optional(),
      unit: z.enum(units),
      ...sourced,
    })
    .refine((q) => q.value !== undefined || q.min !== undefined || q.max !== undefined, 'needs value, or min and max')
    .refine((q) => q.min === undefined || q.max === undefined || q.min <= q.max, 'min is above max')
    .refine(isSourced, { message: SOURCED, path: ['source'] });

/** A sentence that claims something, with where it comes from. */
export const claim = z
  .strictObject({ text: line(), sources: citations.optional(), provenance, note: line().optional() })
  .refine(isSourced, { message: SOURCED, path: ['sources'] });

/** A capture arrangement: what the airflow is computed from. The airflow itself is never typed. */
export const capture = z
  .strictObject({
    releaseCondition: line().optional(),
    velocity: quantity(['m/s']).refine((q) => q.min !== undefined && q.max !== undefined, 'needs min and max'),
    hood: z.enum(HOODS),
    distance: quantity(['m']).optional(),
    diameter: quantity(['m']).optional(),
    width: quantity(['m']).optional(),
    height: quantity(['m']).optional(),
    openArea: quantity(['m2']).optional(),
    perimeter: quantity(['m']).optional(),
    note: line().optional(),
  })
  .superRefine((c, context) => {
    const missing = (path: string) =>
      context.addIssue({ code: 'custom', path: [path], message: `a ${c.hood} needs ${path}` });
    if (c.hood === 'enclosure') {
      if (!c.openArea) missing('openArea');
    } else if (c.hood === 'canopy') {
      if (!c.perimeter) missing('perimeter');
      if (!c.distance) missing('distance');
    } else {
      if (!c.distance) missing('distance');
      if (!c.diameter && !(c.width && c.height)) missing('diameter');
    }
  });

export const release = z.strictObject({
  substance: slug,
  form: z.enum(FORMS),
  known: z.enum(BASES),
  sources: citations.optional(),
  note: line().optional(),
});
