import type { ReactNode } from 'react';
import { Quantity } from '@/components/ui/quantity';
import type { Provenance } from '@/lib/entries/vocabulary';
import { Citations } from './citations';

type Value = { value?: number; min?: number; max?: number; source?: string; provenance: Provenance; note?: string };
type Kind = 'velocity' | 'length' | 'area' | 'temperature' | 'density' | 'concentration';

/** One line of a plate: what it is, its value, where that comes from. */
export function PlateLine({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[minmax(6.5rem,9rem)_1fr] gap-x-3 border-t border-rule py-1.5 first:border-t-0">
      <dt className="label">{term}</dt>
      <dd className="min-w-0 [overflow-wrap:anywhere]">{children}</dd>
    </div>
  );
}

/** A stated quantity with what it rests on. */
export function Stated({ kind, of, unit, sources }: { kind: Kind; of: Value; unit?: string; sources: string[] }) {
  return (
    <>
      <Quantity kind={kind} value={of.value} min={of.min} max={of.max} unit={unit} />
      <Citations ids={[of.source]} sources={sources} provenance={of.provenance} note={of.note} />
    </>
  );
}
