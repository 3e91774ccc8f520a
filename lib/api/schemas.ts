import { z } from 'zod';
import { KINDS, LIMIT_BASES, LIMIT_UNITS } from '@/lib/entries/vocabulary';
import { HOODS } from '@/lib/air/hood-airflow';
import { SEARCH_KINDS } from '@/lib/search/search';

/** What each answer of the API holds. Objects are open: a field may be added later, none is renamed. */
export const problemSchema = z
  .looseObject({
    type: z.string(),
    title: z.string(),
    status: z.int().min(400).max(599),
    detail: z.string(),
    errors: z.array(z.strictObject({ path: z.string(), message: z.string() })).optional(),
  })
  .meta({ id: 'Problem', description: 'RFC 9457' });

const control = z
  .enum(['prohibited', 'enclosed exhaust', 'local exhaust', 'general ventilation', 'unknown'])
  .meta({ id: 'Control' });
const basis = z.enum(['reviewed', 'inferred', 'none']).meta({ id: 'Basis' });
const slugs = z.array(z.string());
const range = z.looseObject({ min: z.number(), max: z.number() });

export const searchAnswerSchema = z
  .looseObject({
    query: z.string(),
    total: z.int().min(0),
    tookMs: z.number().min(0),
    pair: z.looseObject({ materials: slugs, process: z.string(), control, basis, url: z.string() }).optional(),
    hits: z.array(
      z.looseObject({
        ...{ kind: z.enum(SEARCH_KINDS), slug: z.string(), title: z.string(), summary: z.string(), url: z.string() },
        ...{ score: z.number(), matched: z.array(z.string()), control: control.optional() },
      }),
    ),
  })
  .meta({ id: 'SearchAnswer' });

const published = {
  kind: z.enum(KINDS),
  slug: z.string(),
  title: z.string(),
  revision: z.int().min(1),
  publishedAt: z.string(),
};

export const entryListSchema = z
  .looseObject({
    items: z.array(z.looseObject({ ...published, url: z.string() })),
    next: z.string().nullable().describe('the cursor of the next page; null on the last'),
  })
  .meta({ id: 'EntryList' });

const source = z
  .looseObject({
    ...{ id: z.string(), title: z.string(), publisher: z.string(), year: z.string() },
    ...{ locator: z.string().optional(), url: z.string().optional() },
  })
  .meta({ id: 'Source' });

export const entrySchema = z
  .looseObject({
    ...published,
    ...{ reviewedBy: z.string(), reviewDue: z.string(), frontMatter: z.record(z.string(), z.unknown()) },
    ...{ html: z.string(), sources: z.array(source), sheets: z.array(z.unknown()) },
  })
  .meta({ id: 'Entry' });

const limit = z.looseObject({
  ...{
    authority: z.string(),
    basis: z.enum(LIMIT_BASES),
    value: z.number(),
    unit: z.enum(LIMIT_UNITS),
    source: z.string(),
  },
});

export const checkAnswerSchema = z
  .looseObject({
    ...{ materials: slugs, process: z.string(), control, basis },
    reasons: z.array(z.looseObject({ text: z.string(), sources: slugs })),
    releases: z.array(z.looseObject({ substance: z.string(), name: z.string(), limits: z.array(limit) })),
    capture: z
      .looseObject({ velocity: range, hood: z.enum(HOODS), airflow: range, equation: z.string() })
      .nullable()
      .describe('null where no capture arrangement is stated, and wherever the control is prohibited or unknown'),
    ...{ cautions: z.array(z.string()), sources: z.array(source) },
    entries: z.array(z.looseObject({ kind: z.enum(KINDS), slug: z.string(), revision: z.int(), url: z.string() })),
  })
  .meta({ id: 'CheckAnswer' });

export const worksheetListSchema = z
  .looseObject({
    items: z.array(
      z.looseObject({
        ...{ name: z.string(), title: z.string(), url: z.string() },
        schema: z.record(z.string(), z.unknown()).describe('JSON Schema of the request'),
      }),
    ),
    next: z.null(),
  })
  .meta({ id: 'WorksheetList' });

export const liveSchema = z.looseObject({ status: z.string() }).meta({ id: 'Live' });
