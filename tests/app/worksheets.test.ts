import Ajv from 'ajv/dist/2020';
import addFormats from 'ajv-formats';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { GET as listed } from '@/app/api/worksheets/route';
import { DELETE, GET, PATCH, POST, PUT } from '@/app/api/worksheets/[name]/route';
import { GET as table } from '@/app/api/worksheets/[name]/table.csv/route';
import { GET as described } from '@/app/api/openapi.json/route';
import { MAX_JSON_BYTES } from '@/lib/api/handle';
import { HOODS } from '@/lib/air/hood-airflow';
import { WORKSHEETS } from '@/lib/worksheets/list';
import { NUMBERS } from '@/lib/worksheets/hood-airflow/fields';

const AT = 'http://localhost/api/worksheets';
const named = (name: string) => ({ params: Promise.resolve({ name }) });
const asked = (body: string, type = 'application/json') =>
  new Request(`${AT}/hood-airflow`, { method: 'POST', headers: { 'content-type': type }, body });
const ask = (body: unknown, name = 'hood-airflow') => POST(asked(JSON.stringify(body)), named(name));

const opening = { hood: 'plain-opening', velocity: 0.5, distance: 0.3, diameter: 0.2 };

async function openApi() {
  const document = await (await described(new Request('http://localhost/api/openapi.json'), {})).json();
  const ajv = new Ajv({ strict: false });
  addFormats(ajv);
  ajv.addSchema(document, 'api');
  const validator = (pointer: string) => ajv.getSchema(`api#${pointer}`)!;
  return { document, validator };
}

describe('the hood worksheet by POST', () => {
  it('answers with the airflow, the working and the warnings, as its schema says', async () => {
    const response = await ask(opening);
    expect(response.status).toBe(200);
    expect(response.headers.get('cache-control')).toBe('no-store');
    const answer = await response.json();
    // By hand: 0.5 (10 × 0.09 + π 0.01) = 0.465708 m3/s.
    expect(answer.result.airflow).toBeCloseTo(0.465708, 6);
    const { validator } = await openApi();
    const fits = validator('/components/schemas/HoodAirflowAnswer');
    expect(fits(answer), JSON.stringify(fits.errors)).toBe(true);
  });

  it.each([
    ['an unknown field', { ...opening, colour: 'red' }, 400],
    ['a number as text', { ...opening, velocity: '0.5' }, 400],
    ['a negative length', { ...opening, distance: -1 }, 422],
    ['a missing size', { ...opening, diameter: undefined }, 422],
  ])('refuses %s as a problem with the path of the fault', async (_, body, status) => {
    const response = await ask(body);
    expect(response.status).toBe(status);
    expect(response.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    const refused = await response.json();
    expect(refused).toMatchObject({
      status,
      type: expect.any(String),
      title: expect.any(String),
      detail: expect.any(String),
    });
    expect(refused.errors[0].path).not.toBe('');
  });

  it('refuses what is not JSON, too large or of another type', async () => {
    expect((await POST(asked('{'), named('hood-airflow'))).status).toBe(400);
    expect((await POST(asked('{}', 'text/plain'), named('hood-airflow'))).status).toBe(415);
    expect((await POST(asked(' '.repeat(MAX_JSON_BYTES + 1)), named('hood-airflow'))).status).toBe(413);
  });

  it('knows no other name', async () => {
    for (const name of ['duct', 'constructor', '__proto__', '']) expect((await ask(opening, name)).status).toBe(404);
  });

  it('answers only to POST, and says so', async () => {
    for (const method of [GET, PUT, PATCH, DELETE]) {
      const response = await method(new Request(`${AT}/hood-airflow`), named('hood-airflow'));
      expect([response.status, response.headers.get('allow')]).toEqual([405, 'POST']);
      expect(response.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    }
    expect((await GET(new Request(`${AT}/duct`), named('duct'))).status).toBe(404);
  });

  it('answers every body with a documented status and never with a fault', async () => {
    const { validator } = await openApi();
    const problem = validator('/components/schemas/Problem');
    const near = fc.record(
      {
        hood: fc.oneof(fc.constantFrom(...HOODS), fc.string()),
        ...Object.fromEntries(
          NUMBERS.map((field) => [field, fc.oneof(fc.double(), fc.double({ min: 0, max: 3 }), fc.jsonValue())]),
        ),
      },
      { requiredKeys: ['hood'] },
    );
    await fc.assert(
      fc.asyncProperty(fc.oneof(near, fc.jsonValue()), async (body) => {
        const response = await ask(body);
        expect([200, 400, 422]).toContain(response.status);
        if (response.status !== 200) expect(problem(await response.json())).toBe(true);
      }),
      { numRuns: 300 },
    );
  });
});

describe('the list of worksheets', () => {
  const get = (headers = {}) => listed(new Request(AT, { headers }), {});

  it('gives each with its address and the schema of its request', async () => {
    const { items } = await (await get()).json();
    expect(items[0]).toMatchObject({ name: 'hood-airflow', url: '/worksheets/hood-airflow' });
    const admits = new Ajv({ strict: false }).compile(items[0].schema);
    expect(admits(opening)).toBe(true);
    expect(admits({ ...opening, colour: 'red' })).toBe(false);
  });

  it('is not sent again to whoever has it', async () => {
    const etag = (await get()).headers.get('etag')!;
    expect(etag).toMatch(/^"[^"]+"$/);
    const again = await get({ 'if-none-match': etag });
    expect([again.status, await again.text()]).toEqual([304, '']);
  });

  it('keeps to its documented shape', async () => {
    const { validator } = await openApi();
    expect(validator('/components/schemas/WorksheetList')(await (await get()).json())).toBe(true);
  });
});

describe('the table of a hood', () => {
  const get = (query: string, name = 'hood-airflow') =>
    table(new Request(`${AT}/${name}/table.csv?${query}`), named(name));

  it('is a CSV in the units of the address', async () => {
    const response = await get('hood=canopy&velocity=200&distance=12&perimeter=16&units=us');
    expect(response.headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(response.headers.get('content-disposition')).toBe('attachment; filename="hood-airflow.csv"');
    expect((await response.text()).split('\r\n')).toEqual(
      expect.arrayContaining(['Distance (in),Velocity (fpm)', '12,200']),
    );
  });

  it('refuses a question that cannot be, and an unknown worksheet', async () => {
    expect((await get('hood=canopy&velocity=fast')).status).toBe(422);
    expect((await get('', 'duct')).status).toBe(404);
  });
});

describe('the description of the API', () => {
  const operations = async () => {
    const { document } = await openApi();
    return { document, paths: Object.keys(document.paths) };
  };

  it('covers every route there is in this slice', async () => {
    const { document, paths } = await operations();
    expect(document.openapi).toBe('3.1.0');
    const all = [
      ...['/api/check', '/api/entries', '/api/entries/{kind}/{slug}', '/api/health/live', '/api/health/ready'],
      ...['/api/openapi.json', '/api/search', '/api/workshops/cope', '/api/workshops/matrix', '/api/worksheets'],
      ...WORKSHEETS.flatMap(({ name }) => [`/api/worksheets/${name}`, `/api/worksheets/${name}/table.csv`]),
    ];
    expect(paths.sort()).toEqual(all.sort());
  });

  it('points only at schemas it holds', async () => {
    const { document } = await operations();
    const text = JSON.stringify(document);
    const names = [...text.matchAll(/#\/components\/schemas\/(\w+)/g)].map(([, name]) => name!);
    expect(names.length).toBeGreaterThan(10);
    for (const name of names) expect(Object.keys(document.components.schemas)).toContain(name);
  });

  it('admits by its request schema what the worksheet admits', async () => {
    const { validator } = await openApi();
    expect(validator('/components/schemas/HoodAirflowRequest')(opening)).toBe(true);
    expect(validator('/components/schemas/HoodAirflowRequest')({ ...opening, velocity: '0.5' })).toBe(false);
  });
});
