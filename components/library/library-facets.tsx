import Link from 'next/link';
import { KIND_WORDS } from '@/components/search/kind-words';
import { CONTROL_WORDS } from '@/components/ui/control-words';
import type { Control, Kind } from '@/lib/entries/vocabulary';
import { browseAddress, type Browsed, type Facet } from '@/lib/search/browse';

const TITLES = { kind: 'Kind', family: 'Family', control: 'Strictest control' } as const;

const wordOf = ({ name, value }: Facet) => {
  if (name === 'kind') return KIND_WORDS[value as Kind].many;
  return name === 'control' ? CONTROL_WORDS[value as Control] : value;
};

/** Choosing what is chosen takes it away; another kind drops the facets of materials. */
function addressOf({ question }: Browsed, { name, value }: Facet): string {
  const chosen = question[name] === value;
  const next = { ...question, page: 1, [name]: chosen ? undefined : value };
  return browseAddress(name === 'kind' ? { kind: next.kind, page: 1 } : next);
}

/** Facets as links, so that they work without scripts and can be sent to somebody. */
export function LibraryFacets({ shown }: { shown: Browsed }) {
  const groups = (['kind', 'family', 'control'] as const).map((name) =>
    shown.facets.filter((facet) => facet.name === name),
  );
  return (
    <nav aria-label="Facets" className="no-print space-y-2">
      {groups
        .filter((facets) => facets.length > 0)
        .map((facets) => (
          <div key={facets[0]!.name} className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
            <span className="label">{TITLES[facets[0]!.name]}</span>
            {facets.map((facet) => {
              const chosen = shown.question[facet.name] === facet.value;
              return (
                <Link
                  key={facet.value}
                  href={addressOf(shown, facet)}
                  prefetch={false}
                  aria-current={chosen ? 'true' : undefined}
                  className={chosen ? 'border-b-2 border-brass font-semibold no-underline' : undefined}
                >
                  {wordOf(facet)} <span className="text-quiet">{facet.count}</span>
                </Link>
              );
            })}
          </div>
        ))}
    </nav>
  );
}
