import Link from 'next/link';
import type { SourceInUse } from '@/lib/search/sources-in-use';

function OneSource({ source, entries }: SourceInUse) {
  return (
    <li id={source.id} className="border-b border-rule py-3">
      <cite className="font-semibold">{source.title}</cite>. {source.publisher}, {source.year}.{' '}
      {source.locator && `${source.locator}. `}
      <span className="label">
        {source.type}; {source.seen}
      </span>
      {source.note && <p>{source.note}</p>}
      <p className="mt-1 text-base">
        {entries.length === 0 && <span className="text-quiet">Cited by no entry.</span>}
        {entries.map(({ title, url }, i) => (
          <span key={url}>
            {i > 0 && ', '}
            <Link href={url} prefetch={false}>
              {title}
            </Link>
          </span>
        ))}
      </p>
    </li>
  );
}

/** The shared list of sources, each with where it is used. */
export function AllSources({ sources }: { sources: SourceInUse[] }) {
  return (
    <ul className="max-w-measure border-t border-rule">
      {sources.map((each) => (
        <OneSource key={each.source.id} {...each} />
      ))}
    </ul>
  );
}
