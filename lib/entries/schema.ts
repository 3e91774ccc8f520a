import { z } from 'zod';
import { isCas } from '@/lib/chemistry/cas';
import {
  capture,
  citations,
  claim,
  integer,
  isSourced,
  line,
  lines,
  MAX_ITEMS,
  MAX_TITLE,
  number,
  provenance,
  quantity,
  release,
  slug,
  sourced,
} from './parts';
import { AUTHORITIES, CONTROLS, FAMILIES, HEATS, LIMIT_BASES, LIMIT_UNITS } from './vocabulary';

const cas = z.string().refine(isCas, 'is not a CAS number with a right check digit');

const common = {
  title: line(MAX_TITLE),
  summary: line(420),
  otherNames: lines,
  everyday: lines.optional(),
  corrections: z
    .array(
      z
        .strictObject({ claim: line(), truth: line(), sources: citations.optional(), provenance })
        .refine(isSourced, { message: 'a published correction must name its source', path: ['sources'] }),
    )
    .max(MAX_ITEMS)
    .optional(),
  related: z
    .array(z.string().regex(/^(material|process|substance|guide|worksheet):[a-z0-9-]+$/, 'must be kind:slug'))
    .max(20)
    .optional(),
  sources: z.array(slug).min(1, 'an entry without a source is not published').max(40),
  reviewEvery: integer.refine((months) => months >= 1 && months <= 60, 'must be 1 to 60 months'),
};

export const pair = z
  .strictObject({
    process: slug,
    control: z.enum(CONTROLS),
    reason: line(),
    releases: z.array(release).max(20),
    measured: line().optional(),
    capture: capture.optional(),
    fire: line().optional(),
    sources: citations,
    provenance,
  })
  .refine(isSourced, { message: 'a published pair must name its sources', path: ['sources'] });

export const materialSchema = z.strictObject({
  kind: z.literal('material'),
  ...common,
  abbreviation: line(30).optional(),
  family: z.enum(FAMILIES),
  cas: cas.optional(),
  composition: z
    .strictObject({
      formula: line(60).optional(),
      parts: z
        .array(z.strictObject({ name: line(80), formula: line(60).optional(), share: line(60).optional() }))
        .max(12)
        .optional(),
      concern: z.array(z.string().regex(/^[A-Z][a-z]?$/, 'must be an element symbol')).max(12),
      ...sourced,
    })
    .refine(isSourced, { message: 'a published composition must name its source', path: ['source'] }),
  density: quantity(['g/cm3']).optional(),
  temperatures: z
    .array(z.strictObject({ event: line(120), at: quantity(['°C']) }))
    .max(8)
    .optional(),
  lookAlikes: z
    .array(z.strictObject({ material: slug, tell: line() }))
    .max(10)
    .optional(),
  insteadOf: z
    .array(z.strictObject({ material: slug, why: line() }))
    .max(8)
    .optional(),
  pairs: z.array(pair).max(30),
  emissions: z
    .array(
      z
        .strictObject({
          process: slug,
          quantity: line(120),
          value: line(60),
          unit: line(40),
          conditions: line().optional(),
          ...sourced,
        })
        .refine(isSourced, { message: 'a published emission must name its source', path: ['source'] }),
    )
    .max(20)
    .optional(),
});

export const processSchema = z.strictObject({
  kind: z.literal('process'),
  ...common,
  heat: z.enum(HEATS),
  capture,
  usual: line(),
  cautions: z.array(claim).min(1).max(20),
  protection: z.array(claim).max(20),
  waste: z.array(claim).max(20),
  mishap: z.array(claim).min(1).max(20),
});

export const limit = z.strictObject({
  authority: z.enum(AUTHORITIES),
  basis: z.enum(LIMIT_BASES),
  value: number.refine((value) => value > 0, 'must be above zero'),
  unit: z.enum(LIMIT_UNITS),
  averaging: line(60).optional(),
  as: line(60).optional(),
  date: z
    .string()
    .regex(/^\d{4}(-\d{2}(-\d{2})?)?$/, 'must be a year or a date')
    .optional(),
  source: slug,
  provenance,
  supersededBy: line().optional(),
  note: line().optional(),
});

export const substanceSchema = z.strictObject({
  kind: z.literal('substance'),
  ...common,
  cas: cas.optional(),
  formula: line(60).optional(),
  molarMass: number.optional(),
  molarMassSource: slug.optional(),
  limits: z.array(limit).max(24),
  limitsNote: line().optional(),
  odour: z
    .strictObject({
      threshold: quantity(['ppm', 'mg/m3']).optional(),
      warns: z.enum(['yes', 'no', 'not reliably', 'unknown']),
      text: line(),
      sources: citations.optional(),
      provenance,
    })
    .optional(),
  carcinogen: z
    .strictObject({ group: z.enum(['1', '2A', '2B', '3', 'not evaluated']), body: z.literal('IARC'), ...sourced })
    .refine(isSourced, { message: 'a published group must name its source', path: ['source'] })
    .optional(),
  effects: z.array(claim).max(20),
  symptoms: lines,
});

export const guideSchema = z.strictObject({ kind: z.literal('guide'), ...common });

/** Front matter of an entry, told apart by `kind`. Texts in, numbers out. */
export const entrySchema = z.discriminatedUnion('kind', [materialSchema, processSchema, substanceSchema, guideSchema]);

export const sourceSchema = z.strictObject({
  id: slug,
  title: line(300),
  publisher: line(160),
  year: line(30),
  type: z.enum(['regulation', 'guidance', 'study', 'handbook', 'standard', 'dataset']),
  locator: line(200).optional(),
  url: z
    .url({ protocol: /^https$/ })
    .max(300)
    .optional(),
  seen: z.enum(['full text', 'abstract or extract', 'not seen: named from memory']),
  note: line().optional(),
});

export type Material = z.infer<typeof materialSchema>;
export type Process = z.infer<typeof processSchema>;
export type Substance = z.infer<typeof substanceSchema>;
export type Guide = z.infer<typeof guideSchema>;
export type FrontMatter = z.infer<typeof entrySchema>;
export type Pair = z.infer<typeof pair>;
export type Limit = z.infer<typeof limit>;
export type Capture = z.infer<typeof capture>;
export type Source = z.infer<typeof sourceSchema>;
