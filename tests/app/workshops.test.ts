import { describe, expect, it } from 'vitest';
import { POST as cope } from '@/app/api/workshops/cope/route';
import { POST as matrix } from '@/app/api/workshops/matrix/route';
import { MAX_JSON_BYTES } from '@/lib/api/handle';
import { EXAMPLE_PLAN } from '@/lib/workshops/example';

const asked = (body: string, type = 'application/json') =>
  new Request('http://localhost/api/workshops/cope', { method: 'POST', headers: { 'content-type': type }, body });
const question = { workshop: EXAMPLE_PLAN, station: 'laser cutter', material: ['acrylic'] };

describe.each([
  ['cope', cope],
  ['matrix', matrix],
])('a workshop sent to %s', (_, handler) => {
  it.each([
    ['no JSON', '{', 'application/json', 400],
    ['another type', '{}', 'text/plain', 415],
    ['too much', `{"workshop":"${'x'.repeat(MAX_JSON_BYTES)}"}`, 'application/json', 413],
    ['an unknown field', JSON.stringify({ ...question, colour: 'red' }), 'application/json', 400],
    [
      'a number as text',
      JSON.stringify({ ...question, workshop: { rooms: [{ volume: '60' }] } }),
      'application/json',
      400,
    ],
    [
      'a negative room',
      JSON.stringify({ ...question, workshop: { rooms: [{ volume: -60 }] } }),
      'application/json',
      422,
    ],
    [
      'a fan curve of one point',
      JSON.stringify({
        ...question,
        workshop: { exhausts: [{ fan: { curve: [{ airflow: 0, staticPressure: 1 }] } }] },
      }),
      'application/json',
      422,
    ],
    [
      'too many rooms',
      JSON.stringify({ ...question, workshop: { rooms: Array(50).fill({}) } }),
      'application/json',
      422,
    ],
  ])('with %s is refused as a problem', async (__, body, type, status) => {
    const response = await handler(asked(body, type), {});
    // The matrix takes a workshop and nothing else, so to it even a good question of the other kind is malformed.
    expect(handler === matrix && status === 422 ? [400, 422] : [status]).toContain(response.status);
    expect(response.headers.get('content-type')).toMatch(/^application\/problem\+json/);
  });
});
