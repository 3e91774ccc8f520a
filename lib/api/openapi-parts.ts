import type { z } from 'zod';
import { problemSchema } from './schemas';

const WORDS = {
  400: 'Malformed, or a field that is not known.',
  404: 'No such thing.',
  413: 'Too large.',
  415: 'Not JSON.',
  422: 'Understood and impossible.',
  503: 'Not ready, with the reason.',
} as const;

/** A JSON answer of the given schema. */
export const json = (description: string, schema: z.ZodType) => ({
  ...{ description, content: { 'application/json': { schema } } },
});

/** Refusals by status, all of one shape. */
export const refusals = (...statuses: (keyof typeof WORDS)[]) =>
  Object.fromEntries(
    statuses.map((status) => [
      status,
      { description: WORDS[status], content: { 'application/problem+json': { schema: problemSchema } } },
    ]),
  );

/** What a GET with a strong ETag may answer besides. */
export const notModified = { 304: { description: 'Not changed since the ETag that was sent.' } };
