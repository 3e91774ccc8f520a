import Link from 'next/link';
import { ControlLine } from '@/components/ui/control-line';
import { Panel } from '@/components/ui/panel';
import type { PairAnswer } from '@/lib/search/search';

/** The answer to a material and a process named together, on top and on its own: the control first, then why. */
export function PairBlock({ pair }: { pair: PairAnswer }) {
  return (
    <Panel title={pair.title}>
      <ControlLine control={pair.control} reason={pair.reason} basis={pair.basis} size="medium" />
      {pair.basis === 'none' && (
        <p className="mt-2">No reviewed entry covers this. Treat it as prohibited until one does.</p>
      )}
      <p className="mt-2">
        <Link href={pair.url} prefetch={false}>
          The whole check: what is released, the capture, the sources
        </Link>
      </p>
    </Panel>
  );
}
