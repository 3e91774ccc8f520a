import { describe, expect, it } from 'vitest';
import { DILUTION_EXAMPLE } from '@/lib/worksheets/dilution/example';
import { dilutionRequest } from '@/lib/worksheets/dilution/schema';
import { parseRequest } from '@/lib/worksheets/parse-request';

const mass = { generation: { massRate: 5 }, limit: { value: 50, unit: 'mg/m3' }, mixingFactor: 3 };
const asked = (more: object) => parseRequest(dilutionRequest, { ...mass, ...more });

describe('a question of dilution', () => {
  it('is admitted by mass, by liquid and as its example', () => {
    for (const question of [mass, { ...mass, circumstances: ['combustible'] }, DILUTION_EXAMPLE])
      expect(parseRequest(dilutionRequest, question)).toEqual({ ok: true, value: question });
  });

  it.each([
    ['no release', { generation: {} }, 'generation.massRate'],
    ['a liquid without its molar mass', { generation: { liquidRate: 1, specificGravity: 1 } }, 'generation.molarMass'],
    ['a mixing factor better than perfect', { mixingFactor: 0.99 }, 'mixingFactor'],
    ['a mixing factor beyond very poor', { mixingFactor: 10.1 }, 'mixingFactor'],
    ['no mixing factor', { mixingFactor: undefined }, 'mixingFactor'],
    ['a limit of nothing', { limit: { value: 0, unit: 'ppm' } }, 'limit.value'],
    ['a limit too small to be one', { limit: { value: 5e-324, unit: 'mg/m3' } }, 'limit.value'],
    ['another unit', { limit: { value: 1, unit: 'ppb' } }, 'limit.unit'],
    ['a release without an end', { generation: { massRate: Infinity } }, 'generation.massRate'],
  ])('with %s is understood and impossible, and says where', (_, more, path) => {
    const answer = asked(more);
    expect(answer).toMatchObject({ ok: false, status: 422 });
    expect(answer.ok ? [] : answer.errors?.map((fault) => fault.path)).toContain(path);
  });

  it.each([
    ['a number as text', { mixingFactor: '3' }, 'mixingFactor'],
    ['a field that it does not have', { generation: { massRate: 5, colour: 'red' } }, 'generation.colour'],
    ['a limit without its object', { limit: 50 }, 'limit'],
  ])('with %s is not understood', (_, more, path) => {
    const answer = asked(more);
    expect(answer).toMatchObject({ ok: false, status: 400 });
    expect(answer.ok ? [] : answer.errors?.map((fault) => fault.path)).toContain(path);
  });
});
