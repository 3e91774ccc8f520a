import Link from 'next/link';
import { ControlLine } from '@/components/ui/control-line';
import type { SearchHit } from '@/lib/search/search';
import { KIND_WORDS } from './kind-words';

/** One hit: what it is, what it says first, why it was found, and the wrong belief the question came close to. */
export function HitItem({ hit }: { hit: SearchHit }) {
  return (
    <li className="max-w-measure space-y-1.5 border-b border-rule py-4">
      <p className="label">{KIND_WORDS[hit.kind].one}</p>
      <h2>
        <Link href={hit.url} prefetch={false}>
          {hit.title}
        </Link>
      </h2>
      <p>{hit.summary}</p>
      {hit.control && (
        <ControlLine control={hit.control} reason="The strictest among the processes it was reviewed for." />
      )}
      {hit.correction && (
        <p className="border-l-4 border-ink pl-3">
          <strong>Often said, and wrong:</strong> {hit.correction.claim} <strong>Instead:</strong>{' '}
          {hit.correction.truth}
        </p>
      )}
      <p className="label">Found by: {hit.matched.join(', ')}</p>
    </li>
  );
}
