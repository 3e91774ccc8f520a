import type { SearchIndex } from './build-index';
import { joined, wordsOf } from './tokens';

/**
 * The slugs of a kind that a typed name stands for: those titled so, else those that are otherwise called so. Several when they share
 * the name, so that the strictest can decide; none when the library does not know the name. A name is never guessed at: one letter
 * off is another material.
 */
export function resolveName(index: SearchIndex, kind: 'material' | 'process', name: string): string[] {
  const isOwn = index.pages.some((page) => page.kind === kind && page.slug === name);
  if (isOwn) return [name];
  const named = (index.names.get(joined(wordsOf(name))) ?? []).filter(
    ({ document }) => index.pages[document]!.kind === kind,
  );
  const titled = named.filter(({ weight }) => weight === 1);
  return (titled.length > 0 ? titled : named).map(({ document }) => index.pages[document]!.slug);
}
