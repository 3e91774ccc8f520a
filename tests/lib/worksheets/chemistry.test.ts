import { describe, expect, it } from 'vitest';
import { exposureRequest } from '@/lib/worksheets/exposure/schema';
import { solveExposure } from '@/lib/worksheets/exposure/solve';
import { releaseRequest } from '@/lib/worksheets/release/schema';
import { solveRelease } from '@/lib/worksheets/release/solve';
import { libraryFacts } from './library-facts';

const release = (question: object) => {
  const answer = solveRelease(releaseRequest.parse(question), libraryFacts);
  if (!answer.ok) throw new Error(JSON.stringify(answer));
  return answer.value;
};
const exposure = (question: object) => solveExposure(exposureRequest.parse(question), libraryFacts);

describe('the release worksheet', () => {
  // An unlabelled white sheet, 2 m of cut, kerf 0.2 mm, 3 mm thick, 1.4 g/cm3, 60 m3: by hand 1.68 g lost, at most 0.98 g of hydrogen
  // chloride, 16 mg/m3, 11 ppm.
  it('meets a hand sum for a sheet of solid PVC', () => {
    const { result } = release({
      material: 'pvc',
      cut: { length: 2, kerf: 0.0002, thickness: 0.003, density: 1400 },
      room: { volume: 60 },
    });
    expect(result.massLost).toBeCloseTo(1.68, 9);
    const [acid] = result.releases;
    expect(acid).toMatchObject({ substance: 'hydrogen-chloride' });
    expect(acid!.massAtMost).toBeCloseTo(0.98, 2);
    expect(acid!.concentrationAtMost!.value).toBeCloseTo(16.3, 1);
    expect(Math.round(acid!.ppmAtMost!)).toBe(11);
  });

  it('takes the highest density the library states, and says that nothing makes it right', () => {
    const { result, warnings } = release({ material: 'pvc', cut: { length: 1, kerf: 0.001, thickness: 0.001 } });
    expect(result.massLost).toBeCloseTo(1.45, 9);
    expect(warnings[0]!.code).toBe('halogen');
  });

  it('says how long an airflow takes to bring it under the limit', () => {
    const { result } = release({ formula: 'C2H3Cl', massLost: 10, room: { volume: 60, airflow: 0.1 } });
    const [acid] = result.releases;
    expect(acid!.timeToLimit).toBeCloseTo((60 / 0.1) * Math.log(acid!.ofLimit!), 9);
  });

  it('gives the monomer back where all of it unzips, and isocyanate by rule', () => {
    expect(release({ material: 'acetal', massLost: 2 }).result.releases).toContainEqual(
      expect.objectContaining({ substance: 'formaldehyde', massAtMost: 2 }),
    );
    const foam = release({ material: 'polyurethane-foam', massLost: 100 }).result.releases;
    expect(foam.map(({ substance }) => substance)).toEqual(expect.arrayContaining(['hydrogen-cyanide', 'isocyanates']));
  });

  it('refuses what nobody can bound, and what is not in the library', () => {
    const refused = (question: object) =>
      solveRelease(releaseRequest.parse({ massLost: 1, ...question }), libraryFacts);
    expect(refused({ material: 'no-such-thing' })).toMatchObject({
      ok: false,
      status: 422,
      errors: [{ path: 'material' }],
    });
    expect(refused({ material: 'fr-4' })).toMatchObject({
      ok: false,
      status: 422,
      errors: [{ path: 'material' }],
    });
    expect(refused({ formula: 'Xq2' })).toMatchObject({ ok: false, status: 422, errors: [{ path: 'formula' }] });
  });
});

describe('the exposure worksheet', () => {
  it('adds shares of one body’s limits, through ppm and mg/m³ alike', () => {
    // 29 CFR 1910.1000, Table Z-2: toluene 200 ppm over a shift.
    const answer = exposure({
      items: [{ substance: 'toluene', value: 100, unit: 'ppm' }],
      basis: 'TWA',
      authority: 'OSHA',
    });
    expect(answer.ok && answer.value.result).toMatchObject({ sum: 0.5, within: true });
    const mass = exposure({
      items: [{ substance: 'toluene', value: (100 * 92.141) / 24.45, unit: 'mg/m3' }],
      basis: 'TWA',
      authority: 'osha',
    });
    expect(mass.ok && mass.value.result.sum).toBeCloseTo(0.5, 4);
  });

  it('takes the strictest where no body is named, and is over above 1', () => {
    const two = {
      items: [
        { substance: 'toluene', value: 100, unit: 'ppm' },
        { substance: 'acetone', value: 300, unit: 'ppm' },
      ],
      basis: 'TWA',
    };
    const answer = exposure(two);
    expect(answer.ok && answer.value.result.within).toBe(false);
    expect(answer.ok && answer.value.warnings[0]!.code).toBe('over');
  });

  it('says which limits there are where the asked one is not', () => {
    const answer = exposure({
      items: [{ substance: 'hydrogen-chloride', value: 1, unit: 'ppm' }],
      basis: 'TWA',
      authority: 'OSHA',
    });
    expect(answer).toMatchObject({
      ok: false,
      status: 422,
      errors: [{ path: 'items.0.substance', message: expect.stringContaining('OSHA ceiling') }],
    });
    expect(exposure({ items: [{ substance: 'unheard-of', value: 1, unit: 'ppm' }], basis: 'TWA' })).toMatchObject({
      ok: false,
      status: 422,
    });
  });
});
