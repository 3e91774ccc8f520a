import { describe, expect, it } from 'vitest';
import { CLEARING_TIME_EXAMPLE } from '@/lib/worksheets/clearing-time/example';
import { clearingTimeRequest } from '@/lib/worksheets/clearing-time/schema';
import { parseRequest } from '@/lib/worksheets/parse-request';

const room = { volume: 60, airflow: 0.2 };
const asked = (more: object) => parseRequest(clearingTimeRequest, { ...room, ...more });

describe('a question of clearing', () => {
  it.each([
    [{ removal: 0.99 }],
    [{ from: 50, to: 5 }],
    [{ massRate: 2, duration: 600 }],
    [{ massRate: 2, duration: 600, to: 1 }],
    [{ removal: 0.9, mixingFactor: 3, cleanAir: 0.05, circumstances: ['combustible'] }],
    [CLEARING_TIME_EXAMPLE],
  ])('is admitted as %j', (more) => expect(asked(more)).toMatchObject({ ok: true, value: more }));

  it.each([
    ['nothing to reach', {}, 'removal'],
    ['a share and a source', { removal: 0.9, massRate: 2, duration: 60 }, 'removal'],
    ['two concentrations and a source', { from: 5, to: 1, massRate: 2, duration: 60 }, 'from'],
    ['a share and a concentration to reach', { removal: 0.9, to: 1 }, 'from'],
    ['a concentration to reach from nowhere', { to: 1 }, 'from'],
    ['an end as high as the start', { from: 5, to: 5 }, 'to'],
    ['an end at nothing', { from: 5, to: 0 }, 'to'],
    ['an end too small to be one', { from: 1e9, to: 5e-324 }, 'to'],
    ['a source without a release', { duration: 60 }, 'massRate'],
    ['a source that ran no time', { massRate: 2, duration: 0 }, 'duration'],
    ['all of it gone', { removal: 1 }, 'removal'],
    ['nothing of it gone', { removal: 0 }, 'removal'],
    ['no airflow', { removal: 0.9, airflow: 0 }, 'airflow'],
    ['no volume', { removal: 0.9, volume: 0 }, 'volume'],
    ['a filter that gives less than nothing', { removal: 0.9, cleanAir: -1 }, 'cleanAir'],
    ['a mixing factor of the other convention', { removal: 0.9, mixingFactor: 0.2 }, 'mixingFactor'],
  ])('with %s is understood and impossible, and says where', (_, more, path) => {
    const answer = asked(more);
    expect(answer).toMatchObject({ ok: false, status: 422 });
    expect(answer.ok ? [] : answer.errors?.map((fault) => fault.path)).toContain(path);
  });

  it('with a number as text or a field that it does not have is not understood', () => {
    expect(asked({ removal: '0.9' })).toMatchObject({ ok: false, status: 400 });
    expect(asked({ removal: 0.9, colour: 'red' })).toMatchObject({ ok: false, status: 400 });
  });
});
