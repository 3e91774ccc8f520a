import type { ZodOpenApiPathsObject } from 'zod-openapi';
import { copeAnswer, copeRequest, matrixAnswer, matrixRequest } from '@/lib/workshops/cope-schema';
import { json, refusals } from './openapi-parts';

const asked = (schema: typeof copeRequest | typeof matrixRequest) => ({
  requestBody: { required: true, content: { 'application/json': { schema } } },
});

/** Sums about a workshop that is sent along: nothing is kept. */
export const workshopPaths: ZodOpenApiPathsObject = {
  '/api/workshops/cope': {
    post: {
      ...{ operationId: 'cope', summary: 'Whether a station of a workshop copes with a pair', tags: ['workshops'] },
      ...asked(copeRequest),
      responses: {
        200: json('The verdict, what limits it, what would change it.', copeAnswer),
        ...refusals(400, 413, 415, 422),
      },
    },
  },
  '/api/workshops/matrix': {
    post: {
      ...{
        operationId: 'matrix',
        summary: 'Every station of a workshop against its usual materials',
        tags: ['workshops'],
      },
      ...asked(matrixRequest),
      responses: { 200: json('A row a station, a cell a material.', matrixAnswer), ...refusals(400, 413, 415, 422) },
    },
  },
};
