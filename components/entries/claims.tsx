import type { z } from 'zod';
import type { claim } from '@/lib/entries/parts';
import { Citations } from './citations';

type Props = { id: string; title: string; claims: z.infer<typeof claim>[]; sources: string[] };

/** A list of statements, each with what it rests on. */
export function Claims({ id, title, claims, sources }: Props) {
  if (claims.length === 0) return null;
  return (
    <section aria-labelledby={id} className="mt-8 max-w-measure">
      <h2 id={id}>{title}</h2>
      <ul className="mt-2 list-disc space-y-1.5 pl-6">
        {claims.map((each) => (
          <li key={each.text}>
            {each.text}
            <Citations ids={each.sources} sources={sources} provenance={each.provenance} note={each.note} />
          </li>
        ))}
      </ul>
    </section>
  );
}
