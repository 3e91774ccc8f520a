import Link from 'next/link';
import { ControlLine } from '@/components/ui/control-line';
import { Quantity } from '@/components/ui/quantity';
import { checkUrl } from '@/lib/check/check';
import type { EntryNames } from '@/lib/entries/entry-names';
import type { Pair } from '@/lib/entries/schema';
import { airflowOfCapture, hoodWorksheetUrl } from '@/lib/worksheets/hood-airflow/from-capture';
import { Citations } from './citations';

type Props = { material: string; pair: Pair; names: EntryNames; sources: string[] };

function Released({ pair, names, sources }: Omit<Props, 'material'>) {
  return (
    <ul className="space-y-1">
      {pair.releases.map((release) => (
        <li key={release.substance}>
          <Link href={`/substances/${release.substance}`} prefetch={false}>
            {names[`substance:${release.substance}`] ?? release.substance}
          </Link>
          , {release.form}: {release.known}
          <Citations ids={release.sources} sources={sources} note={release.note} />
        </li>
      ))}
      {pair.measured && <li className="text-quiet">Amount: {pair.measured}</li>}
    </ul>
  );
}

function PairCapture({ pair }: { pair: Pair }) {
  const airflow = pair.capture && airflowOfCapture(pair.capture);
  if (!pair.capture || !airflow) return null;
  return (
    <p className="mt-1">
      Airflow <Quantity kind="airflow" min={airflow.min} max={airflow.max} /> computed for a {pair.capture.hood}:{' '}
      <Link href={hoodWorksheetUrl(pair.capture)} prefetch={false}>
        open the working
      </Link>
    </p>
  );
}

/** The three cells of a pair: process, control with its reason, what is released and how that is known. */
export function PairCells({ material, pair, names, sources }: Props) {
  return (
    <>
      <th scope="row" className="p-2 text-left align-top">
        <Link href={`/processes/${pair.process}`} prefetch={false}>
          {names[`process:${pair.process}`] ?? pair.process}
        </Link>
        <Link href={checkUrl([material], pair.process)} prefetch={false} className="no-print mt-1 block font-normal">
          Check it
        </Link>
      </th>
      <td className="p-2">
        <ControlLine control={pair.control} reason={pair.reason} />
        <Citations ids={pair.sources} sources={sources} provenance={pair.provenance} />
        {pair.fire && (
          <p className="mt-1">
            <strong>Fire.</strong> {pair.fire}
          </p>
        )}
        <PairCapture pair={pair} />
      </td>
      <td className="p-2">
        <Released {...{ pair, names, sources }} />
      </td>
    </>
  );
}
