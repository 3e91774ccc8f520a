import { Provenance } from '@/components/ui/provenance';
import { SourceNumber } from '@/components/ui/source-number';
import type { Provenance as Known } from '@/lib/entries/vocabulary';

type Props = { ids?: (string | undefined)[]; sources: string[]; provenance?: Known; note?: string };

/** The numbers of the sources a value or claim rests on, then how it is known where it is not published. */
export function Citations({ ids = [], sources, provenance = 'published', note }: Props) {
  const numbers = [...new Set(ids)].map((id) => sources.indexOf(id ?? '') + 1).filter((n) => n > 0);
  return (
    <>
      {numbers.map((n) => (
        <SourceNumber key={n} n={n} />
      ))}{' '}
      <Provenance provenance={provenance} note={note} />
    </>
  );
}
