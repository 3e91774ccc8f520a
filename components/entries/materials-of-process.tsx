import Link from 'next/link';
import { ControlLine } from '@/components/ui/control-line';
import type { Library } from '@/lib/entries/library';
import { pairsOfProcess } from '@/lib/entries/pairs-of';

/** Every material reviewed under a process, the strictest control first. */
export function MaterialsOfProcess({ slug, library }: { slug: string; library: Library }) {
  const pairs = pairsOfProcess(library, slug);
  if (pairs.length === 0) return null;
  return (
    <section aria-labelledby="materials" className="mt-8">
      <h2 id="materials">Materials reviewed under it</h2>
      <ul className="mt-2 grid gap-x-6 gap-y-2 sm:grid-cols-2">
        {pairs.map(({ material, title, pair }) => (
          <li key={material}>
            <Link href={`/materials/${material}#pair-${slug}`} prefetch={false} className="font-semibold">
              {title}
            </Link>
            <ControlLine control={pair.control} />
          </li>
        ))}
      </ul>
      <p className="mt-3 max-w-measure">
        A material that is not listed has not been reviewed: treat it as prohibited until it is.
      </p>
    </section>
  );
}
