import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from 'zod-openapi';
import { z } from 'zod';
import { WORKSHEETS } from '@/lib/worksheets/list';
import { entryPaths } from './openapi-entries';
import { json, notModified, refusals } from './openapi-parts';
import { workshopPaths } from './openapi-workshops';
import { liveSchema, worksheetListSchema } from './schemas';

const worksheetOperation = ({ name, title, summary, request, answer }: (typeof WORKSHEETS)[number]) =>
  ({
    ...{ operationId: `solve-${name}`, summary: title, description: summary, tags: ['worksheets'] },
    requestBody: { required: true, content: { 'application/json': { schema: request } } },
    responses: {
      200: json('The answer, with its working and what to mind.', answer),
      ...refusals(400, 413, 415, 422),
    },
  }) satisfies ZodOpenApiOperationObject;

const tableOperation = ({ name, title, address }: (typeof WORKSHEETS)[number]) =>
  ({
    ...{ operationId: `table-${name}`, summary: `${title} As a table`, tags: ['worksheets'] },
    description: 'The question stands in the query as on the page; bare numbers are SI unless `units=us`.',
    requestParams: { query: address },
    responses: {
      200: { description: 'CSV by RFC 4180.', content: { 'text/csv': { schema: z.string() } } },
      ...notModified,
      ...refusals(422),
    },
  }) satisfies ZodOpenApiOperationObject;

const worksheetPaths = (): ZodOpenApiPathsObject => ({
  '/api/worksheets': {
    get: {
      ...{ operationId: 'list-worksheets', summary: 'The worksheets, with their JSON Schemas', tags: ['worksheets'] },
      responses: { 200: json('All worksheets.', worksheetListSchema), ...notModified },
    },
  },
  ...Object.fromEntries(
    WORKSHEETS.flatMap((each) => [
      [`/api/worksheets/${each.name}`, { post: worksheetOperation(each) }],
      [`/api/worksheets/${each.name}/table.csv`, { get: tableOperation(each) }],
    ]),
  ),
});

const documentPath: ZodOpenApiPathsObject = {
  '/api/openapi.json': {
    get: {
      ...{ operationId: 'openapi', summary: 'This document', tags: ['about'] },
      responses: { 200: json('OpenAPI 3.1.', z.looseObject({ openapi: z.string() })), ...notModified },
    },
  },
};

const healthPaths: ZodOpenApiPathsObject = {
  '/api/health/live': {
    get: {
      ...{ operationId: 'live', summary: 'The process runs', tags: ['health'] },
      responses: { 200: json('It runs.', liveSchema) },
    },
  },
  '/api/health/ready': {
    get: {
      ...{ operationId: 'ready', summary: 'Database, migrations and search index are there', tags: ['health'] },
      responses: { 200: json('Ready.', liveSchema), ...refusals(503) },
    },
  },
};

/** The whole API as an OpenAPI 3.1 document, made of the schemas that also admit the requests. */
export const openApi = () =>
  createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Fumelore',
      version: '1.0.0',
      description:
        'What workshop materials give off, the control each pair of material and process needs, and the arithmetic of air. SI on the wire.',
    },
    servers: [{ url: '/' }],
    paths: { ...entryPaths, ...worksheetPaths(), ...workshopPaths, ...documentPath, ...healthPaths },
  });
