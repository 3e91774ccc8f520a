import Link from 'next/link';
import type { EntryNames } from '@/lib/entries/entry-names';
import { urlOf } from '@/lib/entries/library';
import type { Kind } from '@/lib/entries/vocabulary';

const addressOf = (link: string) => {
  const [kind, slug] = link.split(':') as [Kind | 'worksheet', string];
  return kind === 'worksheet' ? `/worksheets/${slug}` : urlOf(kind, slug);
};

/** Where to read on. */
export function Related({ links, names }: { links: string[]; names: EntryNames }) {
  if (links.length === 0) return null;
  return (
    <nav aria-labelledby="read-on" className="no-print mt-8">
      <h2 id="read-on">Read on</h2>
      <ul className="mt-2 flex flex-wrap gap-x-5 gap-y-1">
        {links.map((link) => (
          <li key={link}>
            <Link href={addressOf(link)} prefetch={false}>
              {names[link] ??
                (link.startsWith('worksheet:') ? `Worksheet: ${link.slice(10).replaceAll('-', ' ')}` : link)}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
