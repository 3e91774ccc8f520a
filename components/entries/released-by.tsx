import Link from 'next/link';
import { ControlLine } from '@/components/ui/control-line';
import type { EntryNames } from '@/lib/entries/entry-names';
import type { Library } from '@/lib/entries/library';
import { pairsReleasing } from '@/lib/entries/pairs-of';

/** Which pairs give a substance off, the strictest control first. */
export function ReleasedBy({ slug, library, names }: { slug: string; library: Library; names: EntryNames }) {
  const pairs = pairsReleasing(library, slug);
  if (pairs.length === 0) return null;
  return (
    <section aria-labelledby="released-by" className="mt-8">
      <h2 id="released-by">What gives it off</h2>
      <ul className="mt-2 grid gap-x-6 gap-y-2 sm:grid-cols-2">
        {pairs.map(({ material, title, pair }) => (
          <li key={`${material} ${pair.process}`}>
            <Link href={`/materials/${material}#pair-${pair.process}`} prefetch={false} className="font-semibold">
              {title}, {(names[`process:${pair.process}`] ?? pair.process).toLowerCase()}
            </Link>
            <ControlLine control={pair.control} />
          </li>
        ))}
      </ul>
    </section>
  );
}
