import Link from 'next/link';
import { EmptyState } from '@/components/ui/empty-state';

/** What to do when nothing of any kind was found: the caution first, then how to go on. */
export function NothingFound({ q }: { q: string }) {
  return (
    <EmptyState title={`Nothing here answers to “${q}”`}>
      <p>
        <strong>A material that nobody can name is not run.</strong> Finding nothing says nothing about what it gives
        off.
      </p>
      <ul className="list-disc space-y-1 pl-5">
        <li>
          A sheet or part without a label: <Link href="/guides/identifying-plastics">find out what it is</Link> before
          it meets heat or a blade.
        </li>
        <li>
          A trade name: look on its label or safety data sheet for the material or its CAS number, and search for that.
        </li>
        <li>A sentence: try the one or two words that name the thing.</li>
        <li>
          Or look through <Link href="/library">everything published</Link>.
        </li>
      </ul>
    </EmptyState>
  );
}
