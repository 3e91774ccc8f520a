import { describe, expect, it } from 'vitest';
import { ductPressureRequest } from '@/lib/worksheets/duct-pressure/schema';
import { solveDuctPressure } from '@/lib/worksheets/duct-pressure/solve';

const solve = (question: object) => solveDuctPressure(ductPressureRequest.parse(question));
const pipe = (diameter: number, more: object = {}) => ({
  airflow: 500 / 3600,
  hood: { entryLossFactor: 0 },
  runs: [
    {
      duct: 'galvanised-steel',
      diameter,
      length: 8,
      fittings: [{ fitting: 'bend of the maker', count: 4, k: 0.3 }],
      ...more,
    },
  ],
});
const codes = (question: object) => solve(question).warnings.map(({ code }) => code);

describe('the duct worksheet', () => {
  // A shop’s own question, 500 m3/h through 8 m with four bends of 0.3: reckoned by hand with f = 0.02 and air of 1.2 kg/m3, by which
  // straight pipe and bends lose 525, 191 and 84 Pa at 17.7, 11.3 and 7.9 m/s. Colebrook’s f differs a little, so 8 %.
  it.each([
    [0.1, 17.7, 525],
    [0.125, 11.3, 191],
    [0.15, 7.9, 84],
  ])('meets a hand sum for a pipe of %s m', (diameter, velocity, loss) => {
    const [run] = solve(pipe(diameter)).result.runs;
    expect(Math.abs(run!.velocity / velocity - 1)).toBeLessThan(0.01);
    expect(Math.abs((run!.friction + run!.fittings) / loss - 1)).toBeLessThan(0.08);
  });

  it('adds hood, runs, filter and outlet', () => {
    const { result } = solve({
      ...pipe(0.125),
      hood: { entryLossFactor: 0.5 },
      outlet: { k: 0.2 },
      filter: { clean: 50, loaded: 150, at: 500 / 3600 },
    });
    const [run] = result.runs;
    const pv = run!.velocityPressure;
    expect(result.hoodStaticPressure).toBeCloseTo(1.5 * pv, 9);
    expect(result.staticPressure).toBeCloseTo(1.5 * pv + run!.friction + run!.fittings + 50 + 0.2 * pv, 9);
    expect(result.fanStaticPressure).toBeCloseTo(result.staticPressure - pv, 9);
    expect(result.loadedStaticPressure).toBeCloseTo(result.staticPressure + 100, 9);
  });

  it('loses less pressure in thin air at the same airflow', () => {
    const high = solve({ ...pipe(0.125), air: { temperature: 20, altitude: 2000 } }).result.staticPressure;
    expect(high).toBeLessThan(solve(pipe(0.125)).result.staticPressure);
  });

  it('says what to mind of hose, speed, dust and memory', () => {
    expect(codes(pipe(0.1, { duct: 'flexible-slack' }))).toEqual(
      expect.arrayContaining(['slack-hose', 'beyond-tests', 'long-hose']),
    );
    expect(codes({ ...pipe(0.2), carries: 'heavy-dust' })).toContain('settles');
    expect(codes({ ...pipe(0.05) })).toContain('loud');
    expect(codes({ ...pipe(0.125), airflow: 1e-5 })).toContain('laminar');
    expect(codes({ ...pipe(0.125, { fittings: [{ fitting: 'weather-cap-1', count: 1 }] }) })).toContain('from-memory');
  });

  it.each([
    ['a fitting without a figure', { fittings: [{ fitting: 'wall-cap', count: 1 }] }, ['runs', 0, 'fittings', 0, 'k']],
    ['half a bend', { fittings: [{ fitting: 'mitre-90', count: 0.5 }] }, ['runs', 0, 'fittings', 0, 'count']],
    ['a steel pipe pushed together', { compression: 0.2 }, ['runs', 0, 'compression']],
    ['a roughness wider than the pipe', { roughness: 0.05, diameter: 0.05 }, ['runs', 0, 'roughness']],
    ['no width', { diameter: 0 }, ['runs', 0, 'diameter']],
  ])('refuses %s beside its field', (_, more, path) =>
    expect(ductPressureRequest.safeParse(pipe(0.125, more)).error?.issues[0]?.path).toEqual(path),
  );
});
