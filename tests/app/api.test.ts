import Ajv2020 from 'ajv/dist/2020';
import addFormats from 'ajv-formats';
import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as check } from '@/app/api/check/route';
import { GET as entry } from '@/app/api/entries/[kind]/[slug]/route';
import { GET as entries } from '@/app/api/entries/route';
import { GET as live } from '@/app/api/health/live/route';
import { GET as openapi } from '@/app/api/openapi.json/route';
import { GET as search } from '@/app/api/search/route';
import { importLibrary } from '@/lib/entries/import-library';
import { contentFiles, contentSources } from '../content';
import { freshDatabase } from '../database';

const at = (path: string, headers: HeadersInit = {}) => new Request(`http://127.0.0.1${path}`, { headers });
const ask = async (
  handler: (request: Request, context: never) => Promise<Response>,
  path: string,
  headers?: HeadersInit,
) => {
  const [kind, slug] = path.split('?')[0]!.split('/').slice(3);
  const response = await handler(at(path, headers), { params: Promise.resolve({ kind, slug }) } as never);
  const text = await response.text();
  return {
    response,
    status: response.status,
    text,
    body: text && response.headers.get('content-type')?.includes('json') ? JSON.parse(text) : undefined,
  };
};

beforeAll(async () => {
  await freshDatabase();
  const by = { author: 'editor', reviewer: 'reviewer', invented: true, at: new Date('2026-03-01T00:00:00Z') };
  expect((await importLibrary(contentFiles(), contentSources(), by)).ok).toBe(true);
});

describe('GET /api/check', () => {
  it('answers PVC in a laser as prohibited, with hydrogen chloride and its limits', async () => {
    const { status, body } = await ask(check, '/api/check?material=pvc&process=laser-cutting');
    expect(status).toBe(200);
    expect(body).toMatchObject({
      materials: ['pvc'],
      process: 'laser-cutting',
      control: 'prohibited',
      basis: 'reviewed',
      capture: null,
    });
    const acid = body.releases.find((release: { substance: string }) => release.substance === 'hydrogen-chloride');
    expect(acid).toMatchObject({
      cas: '7647-01-0',
      limits: expect.arrayContaining([
        expect.objectContaining({ authority: 'OSHA', basis: 'ceiling', value: 5, unit: 'ppm' }),
      ]),
    });
  });

  it('answers what it does not know with 200 and unknown', async () => {
    for (const path of ['/api/check?material=nope&process=laser-cutting', '/api/check?material=pvc&process=nope']) {
      const { status, body } = await ask(check, path);
      expect(status).toBe(200);
      expect(body).toMatchObject({ control: 'unknown', basis: 'none' });
    }
  });

  it('takes several materials and lets the strictest win', async () => {
    const { body } = await ask(check, '/api/check?material=plywood&material=pvc&process=laser-cutting');
    expect(body).toMatchObject({ materials: ['plywood', 'pvc'], control: 'prohibited' });
    expect(body.reasons).toHaveLength(2);
  });

  it.each([
    '',
    '?material=pvc',
    '?process=laser-cutting',
    '?material=&process=a',
    '?material=a&process=a&process=b',
    '?material=a&process=b&x=1',
    `?material=${'a'.repeat(200)}&process=b`,
    `?${Array(9).fill('material=a').join('&')}&process=b`,
  ])('refuses %s with 400 and the field', async (query) => {
    const { status, response, body } = await ask(check, `/api/check${query}`);
    expect(status).toBe(400);
    expect(response.headers.get('content-type')).toContain('application/problem+json');
    expect(body.errors.length).toBeGreaterThan(0);
  });
});

describe('GET /api/search', () => {
  it('finds PVC, with the pair on top', async () => {
    const { status, body } = await ask(search, '/api/search?q=can%20i%20laser%20cut%20pvc&limit=5');
    expect(status).toBe(200);
    expect(body).toMatchObject({
      query: 'can i laser cut pvc',
      pair: { materials: ['pvc'], process: 'laser-cutting', control: 'prohibited', basis: 'reviewed' },
    });
    expect(body.hits[0]).toMatchObject({ kind: 'material', slug: 'pvc', url: '/materials/pvc', control: 'prohibited' });
    expect(body.hits.length).toBeLessThanOrEqual(5);
    expect(body.tookMs).toBeGreaterThanOrEqual(0);
  });

  it('keeps to a kind', async () => {
    const { body } = await ask(search, '/api/search?q=formaldehyde&kind=substance');
    expect(new Set(body.hits.map((hit: { kind: string }) => hit.kind))).toEqual(new Set(['substance']));
  });

  it.each([
    '',
    '?q=a&q=b',
    '?q=a&kind=ship',
    '?q=a&limit=0',
    '?q=a&limit=101',
    '?q=a&limit=1e1',
    '?q=a&fuzzy=9',
    `?q=${'a'.repeat(201)}`,
    '?q[]=a',
    '?__proto__=a&q=a',
  ])('refuses %s with 400', async (query) => expect((await ask(search, `/api/search${query}`)).status).toBe(400));

  it('answers any text that is short enough, quickly and without a fault', async () => {
    await fc.assert(
      fc.asyncProperty(fc.string({ unit: 'grapheme', maxLength: 60 }), async (q) => {
        expect((await ask(search, `/api/search?q=${encodeURIComponent(q)}`)).status).toBe(200);
      }),
      { numRuns: 150 },
    );
  });
});

describe('GET /api/entries', () => {
  it('walks the whole library by cursor, each entry once', async () => {
    const seen: string[] = [];
    for (let path: string | null = '/api/entries?limit=60'; path;) {
      const { body } = await ask(entries, path);
      seen.push(...body.items.map((item: { kind: string; slug: string }) => `${item.kind}:${item.slug}`));
      path = body.next && `/api/entries?limit=60&cursor=${body.next}`;
    }
    expect(seen.length).toBe(contentFiles().length);
    expect(new Set(seen).size).toBe(seen.length);
  });

  it('keeps to a kind and to what changed since', async () => {
    expect(
      (await ask(entries, '/api/entries?kind=guide&limit=100')).body.items.every(
        (item: { kind: string }) => item.kind === 'guide',
      ),
    ).toBe(true);
    expect((await ask(entries, '/api/entries?updatedSince=2026-03-01T00:00:00Z')).body.items.length).toBe(50);
    expect((await ask(entries, '/api/entries?updatedSince=2026-03-02T00:00:00Z')).body).toEqual({
      items: [],
      next: null,
    });
  });

  it.each(['?kind=x', '?cursor=x', '?updatedSince=yesterday', '?limit=0', '?limit=101', '?page=1'])(
    'refuses %s with 400',
    async (query) => expect((await ask(entries, `/api/entries${query}`)).status).toBe(400),
  );
});

describe('GET /api/entries/{kind}/{slug}', () => {
  it('gives the entry whole, its sources in the order of their numbers', async () => {
    const { body } = await ask(entry, '/api/entries/substance/formaldehyde');
    expect(body).toMatchObject({
      kind: 'substance',
      slug: 'formaldehyde',
      revision: 1,
      reviewedBy: 'reviewer (invented demo role)',
      sheets: [],
    });
    expect(body.frontMatter).toMatchObject({ cas: '50-00-0', formula: 'CH2O' });
    expect(body.sources.map((source: { id: string }) => source.id)).toEqual(body.frontMatter.sources);
    expect(body.html).toContain('<h2');
  });

  it('gives the Markdown file on request, byte for byte', async () => {
    const { response, text } = await ask(entry, '/api/entries/material/pvc', { accept: 'text/markdown' });
    expect(response.headers.get('content-type')).toBe('text/markdown; charset=utf-8');
    expect(response.headers.get('vary')).toContain('Accept');
    expect(text).toBe(contentFiles().find(({ path }) => path === 'materials/pvc.md')!.text);
  });

  it.each([
    '/api/entries/material/nope',
    '/api/entries/ship/pvc',
    '/api/entries/material/pvc?revision=9',
    '/api/entries/material/__proto__',
  ])('answers %s with 404', async (path) => {
    const { status, body } = await ask(entry, path);
    expect(status).toBe(404);
    expect(body).toMatchObject({ type: 'urn:fumelore:problem:not-found', status: 404 });
  });

  it('refuses a revision that is no number', async () =>
    expect((await ask(entry, '/api/entries/material/pvc?revision=x')).status).toBe(400));
});

describe('every public reading', () => {
  const paths: [string, Parameters<typeof ask>[0]][] = [
    ['/api/check?material=pvc&process=laser-cutting', check],
    ['/api/search?q=pvc', search],
    ['/api/entries?limit=3', entries],
    ['/api/entries/material/pvc', entry],
  ];

  it.each(paths)('%s carries a strong ETag and answers 304 to it', async (path, handler) => {
    const first = await ask(handler, path);
    const etag = first.response.headers.get('etag')!;
    expect(etag).toMatch(/^"[^"]+"$/);
    for (const given of [etag, `W/${etag}`, `"other", ${etag}`, '*']) {
      const again = await ask(handler, path, { 'if-none-match': given });
      expect([again.status, again.text]).toEqual([304, '']);
    }
    expect((await ask(handler, path, { 'if-none-match': '"other"' })).status).toBe(200);
  });

  it('answers as the OpenAPI document says', async () => {
    const document = (await ask(openapi as never, '/api/openapi.json')).body;
    expect(document.openapi).toMatch(/^3\.1/);
    const ajv = new Ajv2020({ strict: false });
    addFormats(ajv);
    ajv.addSchema(document, 'api');
    const pointer = (path: string) =>
      `api#/paths/${path.replaceAll('/', '~1')}/get/responses/200/content/application~1json/schema`;
    const templates = ['/api/check', '/api/search', '/api/entries', '/api/entries/{kind}/{slug}'];
    for (const [i, [path, handler]] of paths.entries()) {
      const validate = ajv.getSchema(pointer(templates[i]!.replaceAll('{', '%7B').replaceAll('}', '%7D')))!;
      expect(validate((await ask(handler, path)).body), JSON.stringify(validate.errors)).toBe(true);
    }
  });

  it('is alive while the process runs', async () => expect((await live()).status).toBe(200));
});
