import type { ReactNode } from 'react';
import { Caution } from '@/components/ui/caution';
import { PrintLine } from '@/components/ui/print-line';
import { SourceList } from '@/components/ui/source-list';
import type { EntryView } from '@/lib/entries/entry-view';
import { urlOf } from '@/lib/entries/library';
import { Corrections } from './corrections';
import { OtherNames } from './other-names';
import { Prose } from './prose';
import { Related } from './related';

type Props = { view: EntryView; kindWord: string; plate?: ReactNode; facts?: ReactNode; after?: ReactNode };

/** The frame of every entry: summary first, plate beside the text, then corrections, sources, caution. */
export function EntryPage({ view: { entry, html, sources, names }, kindWord, plate, facts, after }: Props) {
  const { frontMatter: it } = entry;
  return (
    <article>
      <div className="gap-x-10 lg:grid lg:grid-cols-[minmax(0,1fr)_22rem] lg:grid-rows-[auto_1fr]">
        <header className="max-w-measure">
          <p className="label">{kindWord}</p>
          <h1>{entry.title}</h1>
          <p className="font-reading mt-3 text-xl leading-relaxed">{it.summary}</p>
          <OtherNames names={it.otherNames} />
        </header>
        {plate && <div className="my-6 lg:col-start-2 lg:row-span-2 lg:row-start-1 lg:my-0">{plate}</div>}
        <div className="mt-6 min-w-0">
          {facts}
          <div className="mt-8">
            <Prose html={html} />
          </div>
          <Corrections frontMatter={it} />
          {after}
          <Related links={it.related ?? []} names={names} />
          <SourceList sources={sources} />
        </div>
      </div>
      <Caution />
      <PrintLine
        address={urlOf(entry.kind, entry.slug)}
        revision={entry.revision}
        date={entry.publishedAt.slice(0, 10)}
      />
    </article>
  );
}
