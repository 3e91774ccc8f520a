import type { SearchIndex } from './build-index';
import { nameSpans, type NameSpan } from './names';
import { readQuestion, type Reading } from './reading';
import type { PairNames, SearchKind } from './search';

/** The most materials one question may name: a laminate, a coating and what holds them. */
export const MAX_PAIR_MATERIALS = 4;

/** A pair by document numbers. */
export type FoundPair = { materials: number[]; process: number };

/** Documents of a kind that a name stands for; those called so by title, when there are any, before those called so otherwise. */
function ofKind(index: SearchIndex, span: NameSpan, kind: SearchKind): number[] {
  const named = span.named.filter(({ document }) => index.pages[document]!.kind === kind);
  const titled = named.filter(({ weight }) => weight === 1);
  return (titled.length > 0 ? titled : named).map(({ document }) => document);
}

/**
 * The pair that names found in a question make. A material must be named as the library names it, whatever its spelling, spacing or
 * ending: a word one letter off is never taken for a material, for the answer would be about another one.
 */
export function pairAmong(index: SearchIndex, reading: Reading, spans: readonly NameSpan[]): FoundPair | undefined {
  const isMended = (span: NameSpan) =>
    reading.sequence.slice(span.from, span.to).some((word) => word.mended === 'tolerated');
  const processes = spans.filter((span) => ofKind(index, span, 'process').length > 0);
  const materials = spans.filter((span) => ofKind(index, span, 'material').length > 0 && !isMended(span));
  const only = processes.find((span) => !materials.includes(span)) ?? (materials.length > 1 ? processes[0] : undefined);
  if (!only) return undefined;
  const named = materials.filter((span) => span !== only).sort((a, b) => a.from - b.from);
  const found = [...new Set(named.flatMap((span) => ofKind(index, span, 'material')))].slice(0, MAX_PAIR_MATERIALS);
  return found.length > 0 ? { materials: found, process: ofKind(index, only, 'process')[0]! } : undefined;
}

/** A found pair by slugs and titles. */
export function namesOfPair({ pages }: SearchIndex, { materials, process }: FoundPair): PairNames {
  return {
    materials: materials.map((document) => pages[document]!.slug),
    process: pages[process]!.slug,
    title: `${materials.map((document) => pages[document]!.title).join(' and ')}: ${pages[process]!.title}`,
  };
}

/**
 * The materials and the process that a question names together, longest names first; undefined unless it names both. The machine
 * stands for the process (`laser`, `printer`, `solder`). A name that several materials share gives them all, so that the strictest
 * decides.
 * @example pairIn('can I laser cut PVC?', index) // { materials: ['pvc'], process: 'laser-cutting', title: 'PVC: Laser cutting' }
 */
export function pairIn(query: string, index: SearchIndex): PairNames | undefined {
  const reading = readQuestion(index, query);
  const pair = pairAmong(index, reading, nameSpans(index.names, reading.sequence));
  return pair && namesOfPair(index, pair);
}
