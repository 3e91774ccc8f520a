import Link from 'next/link';

type Props = { label: string; summary?: string; previous?: string; next?: string };

/** Steps through a long list by address, so that a page of it can be linked to. */
export function Pager({ label, summary, previous, next }: Props) {
  if (!previous && !next) return null;
  return (
    <nav aria-label={label} className="mt-6 flex flex-wrap items-center gap-x-6 gap-y-2 border-t border-rule pt-3">
      {previous && (
        <Link href={previous} rel="prev" prefetch={false} className="py-1">
          Previous
        </Link>
      )}
      {summary && <span className="text-quiet">{summary}</span>}
      {next && (
        <Link href={next} rel="next" prefetch={false} className="py-1">
          Next
        </Link>
      )}
    </nav>
  );
}
