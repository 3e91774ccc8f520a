import { z } from 'zod';
import type { ZodOpenApiPathsObject } from 'zod-openapi';
import { KINDS } from '@/lib/entries/vocabulary';
import { MAX_HITS } from '@/lib/search/limits';
import { SEARCH_KINDS } from '@/lib/search/search';
import { json, notModified, refusals } from './openapi-parts';
import { checkAnswerSchema, entryListSchema, entrySchema, searchAnswerSchema } from './schemas';

const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/);

/** What is read: search, entries and the check. */
export const entryPaths: ZodOpenApiPathsObject = {
  '/api/search': {
    get: {
      ...{ operationId: 'search', summary: 'Find in the library', tags: ['reading'] },
      requestParams: {
        query: z.object({
          q: z.string().describe('any text; a long one is cut'),
          kind: z.enum(SEARCH_KINDS).optional(),
          limit: z.int().min(1).max(MAX_HITS).optional(),
        }),
      },
      responses: { 200: json('Hits, the best first.', searchAnswerSchema), ...refusals(400, 422) },
    },
  },
  '/api/entries': {
    get: {
      ...{ operationId: 'list-entries', summary: 'The published entries', tags: ['reading'] },
      requestParams: {
        query: z.object({
          ...{ kind: z.enum(KINDS).optional(), updatedSince: z.iso.datetime({ offset: true }).optional() },
          ...{ cursor: z.string().optional(), limit: z.int().min(1).max(100).optional() },
        }),
      },
      responses: { 200: json('One page of entries.', entryListSchema), ...notModified, ...refusals(400, 422) },
    },
  },
  '/api/entries/{kind}/{slug}': {
    get: {
      ...{ operationId: 'read-entry', summary: 'One published entry', tags: ['reading'] },
      description: 'With `Accept: text/markdown` the Markdown file itself.',
      requestParams: {
        path: z.object({ kind: z.enum(KINDS), slug }),
        query: z.object({ revision: z.int().min(1).optional().describe('an earlier published revision') }),
      },
      responses: {
        200: {
          description: 'The entry.',
          content: { 'application/json': { schema: entrySchema }, 'text/markdown': { schema: z.string() } },
        },
        ...notModified,
        ...refusals(400, 404, 422),
      },
    },
  },
  '/api/check': {
    get: {
      ...{ operationId: 'check', summary: 'Which control a material and a process need', tags: ['reading'] },
      description: 'What is not known is answered with control "unknown" and status 200: treat it as prohibited.',
      requestParams: {
        query: z.object({
          material: z.array(slug).min(1).describe('may repeat: a laminate, a coated stock'),
          process: slug,
        }),
      },
      responses: { 200: json('The control, and why.', checkAnswerSchema), ...notModified, ...refusals(400, 422) },
    },
  },
};
