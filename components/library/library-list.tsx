import Link from 'next/link';
import { KIND_WORDS } from '@/components/search/kind-words';
import { ControlLine } from '@/components/ui/control-line';
import { EmptyState } from '@/components/ui/empty-state';
import { urlOf } from '@/lib/entries/library';
import type { ListedEntry } from '@/lib/search/browse';

function Listed({ entry, control, family }: ListedEntry) {
  return (
    <li className="border-b border-rule py-3">
      <p className="label">
        {KIND_WORDS[entry.kind].one}
        {family && ` · ${family}`}
      </p>
      <h2 className="text-lg">
        <Link href={urlOf(entry.kind, entry.slug)} prefetch={false}>
          {entry.title}
        </Link>
      </h2>
      <p className="max-w-measure text-base">{entry.frontMatter.summary}</p>
      {control && (
        <div className="mt-1 text-base">
          <ControlLine control={control} reason="the strictest among its reviewed processes" />
        </div>
      )}
    </li>
  );
}

/** Entries as a list, each with its summary and, for a material, its strictest control. */
export function LibraryList({ entries }: { entries: ListedEntry[] }) {
  if (entries.length === 0)
    return (
      <EmptyState title="No entry matches these facets.">
        <p>Take one of them away, or search by a name.</p>
      </EmptyState>
    );
  return (
    <ul className="border-t border-rule">
      {entries.map((each) => (
        <Listed key={`${each.entry.kind}:${each.entry.slug}`} {...each} />
      ))}
    </ul>
  );
}
