import Link from 'next/link';
import { SEARCH_KINDS, type SearchAnswer, type SearchKind } from '@/lib/search/search';
import { searchAddress } from '@/lib/search/search-address';
import { KIND_WORDS } from './kind-words';

type Facet = { words: string; count: number; kind?: SearchKind };

/** Links that narrow the results to one kind, each with its count; a kind without a match is left out unless it is shown. */
export function KindLinks({ q, kind, counts }: { q: string; kind?: SearchKind; counts: SearchAnswer['counts'] }) {
  const everything = SEARCH_KINDS.reduce((sum, each) => sum + counts[each], 0);
  const facets: Facet[] = [
    { words: 'Everything', count: everything },
    ...SEARCH_KINDS.filter((each) => counts[each] > 0 || each === kind).map((each): Facet => ({
      words: KIND_WORDS[each].many,
      count: counts[each],
      kind: each,
    })),
  ];
  return (
    <nav aria-label="Narrow the results">
      <ul className="flex flex-wrap gap-x-4 gap-y-1 border-b border-rule">
        {facets.map((facet) => (
          <li key={facet.words}>
            <Link
              href={searchAddress(q, facet.kind)}
              prefetch={false}
              aria-current={facet.kind === kind ? 'true' : undefined}
              className="inline-block border-b-4 border-transparent py-2 aria-[current]:border-brass"
            >
              {facet.words} <span className="figure text-quiet">{facet.count}</span>
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
