import type { Provenance as Known } from '@/lib/entries/vocabulary';

const MARKS: Record<Exclude<Known, 'published'>, string> = {
  'common practice': 'common practice',
  'from memory': 'from memory: check it',
};

/** How a value is known, where it is not published: the source number says that. */
export function Provenance({ provenance, note }: { provenance: Known; note?: string }) {
  if (provenance === 'published' && !note) return null;
  const mark = provenance === 'published' ? undefined : MARKS[provenance];
  return <small className="label whitespace-normal">({[mark, note].filter(Boolean).join('; ')})</small>;
}
