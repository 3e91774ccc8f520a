import Link from 'next/link';
import type { EntryNames } from '@/lib/entries/entry-names';
import type { Material } from '@/lib/entries/schema';

type Line = { material: string; text: string };

function Lines({ id, title, lines, names }: { id: string; title: string; lines: Line[]; names: EntryNames }) {
  if (lines.length === 0) return null;
  return (
    <section aria-labelledby={id} className="mt-8 max-w-measure">
      <h2 id={id}>{title}</h2>
      <ul className="mt-2 list-disc space-y-1.5 pl-6">
        {lines.map(({ material, text }) => (
          <li key={material}>
            <Link href={`/materials/${material}`} prefetch={false}>
              {names[`material:${material}`] ?? material}
            </Link>
            : {text}
          </li>
        ))}
      </ul>
    </section>
  );
}

/** What it may be mistaken for, and what to use in its place. */
export function OtherMaterials({ it, names }: { it: Material; names: EntryNames }) {
  const alike = (it.lookAlikes ?? []).map(({ material, tell }) => ({ material, text: tell }));
  const instead = (it.insteadOf ?? []).map(({ material, why }) => ({ material, text: why }));
  return (
    <>
      <Lines id="look-alikes" title="What else it could be" lines={alike} names={names} />
      <Lines id="instead" title="What to use instead" lines={instead} names={names} />
    </>
  );
}
