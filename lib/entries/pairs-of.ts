import type { Library } from './library';
import type { Material, Pair } from './schema';
import { CONTROLS } from './vocabulary';

export type PairOf = { material: string; title: string; pair: Pair };

const all = (library: Library): PairOf[] =>
  library.entries.flatMap(({ slug, title, frontMatter }) =>
    frontMatter.kind === 'material' ? frontMatter.pairs.map((pair) => ({ material: slug, title, pair })) : [],
  );

const strictest = (a: PairOf, b: PairOf) =>
  CONTROLS.indexOf(b.pair.control) - CONTROLS.indexOf(a.pair.control) || a.title.localeCompare(b.title);

/** Every reviewed pair of a process, the strictest control first. */
export const pairsOfProcess = (library: Library, process: string) =>
  all(library)
    .filter(({ pair }) => pair.process === process)
    .sort(strictest);

/** Every reviewed pair that releases a substance, the strictest control first. */
export const pairsReleasing = (library: Library, substance: string) =>
  all(library)
    .filter(({ pair }) => pair.releases.some((release) => release.substance === substance))
    .sort(strictest);

/** The strictest control among a material's pairs; undefined without one. */
export const strictestOf = ({ pairs }: Material) =>
  [...CONTROLS].reverse().find((control) => pairs.some((pair) => pair.control === control));
