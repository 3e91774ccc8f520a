import type { Source } from '@/lib/entries/schema';

const SEEN: Record<Source['seen'], string | undefined> = {
  'full text': undefined,
  'abstract or extract': 'seen in extract',
  'not seen: named from memory': 'not seen: named from memory, check it',
};

function SourceItem({ source, n }: { source: Source; n: number }) {
  const seen = SEEN[source.seen];
  return (
    <li id={`source-${n}`} className="target:bg-brass/15">
      <cite>{source.url ? <a href={source.url}>{source.title}</a> : source.title}</cite>. {source.publisher},{' '}
      {source.year}.{source.locator && ` ${source.locator}.`}
      {seen && <small className="label"> ({seen})</small>}
      {source.note && <small className="block text-quiet">{source.note}</small>}
    </li>
  );
}

/** The sources of a page, numbered in the order in which the text meets them: the first is source 1. */
export function SourceList({ sources, heading = 'Sources' }: { sources: Source[]; heading?: string }) {
  if (sources.length === 0) return null;
  return (
    <section aria-labelledby="sources" className="mt-10 border-t-2 border-ink pt-4">
      <h2 id="sources">{heading}</h2>
      <ol className="source-list mt-3 max-w-measure list-decimal space-y-2 pl-7 text-base marker:font-mono marker:text-sm">
        {sources.map((source, i) => (
          <SourceItem key={source.id} source={source} n={i + 1} />
        ))}
      </ol>
    </section>
  );
}
