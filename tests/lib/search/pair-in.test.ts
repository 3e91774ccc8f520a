import { beforeAll, describe, expect, it } from 'vitest';
import { buildIndex, type SearchIndex } from '@/lib/search/build-index';
import { MACHINE_WORDS } from '@/lib/search/machine-words';
import { pairIn } from '@/lib/search/pair-in';
import { documentFor } from './factories';

const process = (slug: string) => documentFor('process', slug, { names: [...(MACHINE_WORDS[slug] ?? [])] });
const DOCUMENTS = [
  documentFor('material', 'pvc', { title: 'PVC', names: ['vinyl', 'polyvinyl chloride'] }),
  documentFor('material', 'vinyl-film', { title: 'Vinyl film', names: ['vinyl', 'sign vinyl'] }),
  documentFor('material', 'acrylic', { title: 'Acrylic', names: ['PMMA', 'perspex'] }),
  documentFor('material', 'acrylic-fabric', { title: 'Acrylic fabric' }),
  documentFor('material', 'galvanised-steel', { title: 'Galvanised steel', names: ['galv', 'zinc-coated steel'] }),
  documentFor('material', 'leaded-solder', { title: 'Leaded solder' }),
  documentFor('material', 'copper', { title: 'Copper' }),
  documentFor('material', 'plywood', { title: 'Plywood' }),
  documentFor('material', 'spray-paint', { title: 'Spray paint' }),
  documentFor('material', 'polyester-resin', { title: 'Polyester resin', names: ['polyester'] }),
  ...Object.keys(MACHINE_WORDS).map(process),
  documentFor('substance', 'copper-fume', { title: 'Copper fume' }),
];

let index: SearchIndex;
beforeAll(async () => {
  index = await buildIndex(DOCUMENTS);
});

describe('a pair in a question', () => {
  it.each([
    ['can I laser cut PVC?', ['pvc'], 'laser-cutting'],
    ['PMMA laser engraving fumes', ['acrylic'], 'laser-engraving'],
    ['engrave perspex', ['acrylic'], 'laser-engraving'],
    ['welding galvanized steels outdoors', ['galvanised-steel'], 'welding'],
    ['zinc coated steel on the angle grinder', ['galvanised-steel'], 'grinding'],
    ['lasercutting plywood', ['plywood'], 'laser-cutting'],
    ['acrylic fabric under the heat press', ['acrylic-fabric'], 'heat-pressing'],
    ['soldering with leaded solder', ['leaded-solder'], 'soldering'],
    ['plywood with acrylic on top in the laser', ['plywood', 'acrylic'], 'laser-cutting'],
    ['lazer PVC', ['pvc'], 'laser-cutting'],
    ['spray paint on plywood', ['plywood'], 'spray-painting'],
  ])('hears %s', (question, materials, process) => {
    expect(pairIn(question, index)).toMatchObject({ materials, process });
  });

  it('gives every material that a shared name may mean', () => {
    expect(pairIn('laser vinyl', index)).toEqual({
      materials: ['pvc', 'vinyl-film'],
      process: 'laser-cutting',
      title: 'PVC and Vinyl film: laser cutting',
    });
  });

  it('takes the longest name: a vinyl cutter is a machine, not a material', () => {
    expect(pairIn('vinyl cutter settings', index)).toBeUndefined();
    expect(pairIn('vinyl film on the vinyl cutter', index)).toMatchObject({
      materials: ['vinyl-film'],
      process: 'blade-cutting',
    });
  });

  it('does not take half of a name for the name, when the rest is a small word', async () => {
    const glue = documentFor('material', 'glue', { title: 'Solvent cement', names: ['Weld-On'] });
    const welding = documentFor('process', 'welding', { title: 'Welding', names: ['MIG'] });
    expect(pairIn('mig welding', await buildIndex([glue, welding]))).toBeUndefined();
  });

  it('does not take a substance for the material in its name', () => {
    expect(pairIn('laser copper fume', index)).toBeUndefined();
  });

  it.each(['PVC', 'laser', '', 'is it ok', 'polyethylene laser', 'leaded solder', 'spray paint'])(
    'hears no pair in “%s”',
    (question) => {
      expect(pairIn(question, index)).toBeUndefined();
    },
  );

  it.each(['laser cut acrylik', 'laser cut polyesther', 'laser plywoods2'])(
    'never guesses the material in “%s”',
    (question) => {
      expect(pairIn(question, index)).toBeUndefined();
    },
  );
});
