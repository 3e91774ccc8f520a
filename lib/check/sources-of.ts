import type { Library } from '@/lib/entries/library';
import type { Process } from '@/lib/entries/schema';
import type { CitedSource, Reason, ReleasedSubstance } from './check';

/** Every source the answer rests on, once each, in the order in which the answer meets them. */
export function citedSources(
  library: Library,
  reasons: Reason[],
  releases: ReleasedSubstance[],
  process: Process | undefined,
): CitedSource[] {
  const ids = [
    ...reasons.flatMap(({ sources }) => sources),
    ...releases.flatMap(({ limits }) => limits.map(({ source }) => source)),
    ...(process?.cautions.flatMap(({ sources }) => sources ?? []) ?? []),
    ...(process?.capture.velocity.source ? [process.capture.velocity.source] : []),
  ];
  return [...new Set(ids)].flatMap((id) => {
    const source = library.sources.get(id);
    if (!source) return [];
    const { title, publisher, year, locator, url } = source;
    return [{ id, title, publisher, year, ...(locator ? { locator } : {}), ...(url ? { url } : {}) }];
  });
}
