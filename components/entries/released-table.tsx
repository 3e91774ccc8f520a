import Link from 'next/link';
import { Quantity } from '@/components/ui/quantity';
import { RuledTable } from '@/components/ui/ruled-table';
import type { ReleasedSubstance } from '@/lib/check/check';

type Shown = ReleasedSubstance['limits'][number];

function Limits({ limits }: { limits: Shown[] }) {
  if (limits.length === 0) return <span className="text-quiet">no numeric limit recorded</span>;
  return (
    <ul>
      {limits.map((limit, i) => (
        <li key={i}>
          {limit.authority} {limit.basis} <Quantity kind="concentration" value={limit.value} unit={limit.unit} />
          {limit.as && ` as ${limit.as}`}
          {limit.provenance !== 'published' && <small className="label"> ({limit.provenance}: check it)</small>}
        </li>
      ))}
    </ul>
  );
}

/** What is released, each against its limits in force. Sources of a limit stand on the substance's own page. */
export function ReleasedTable({ releases }: { releases: ReleasedSubstance[] }) {
  if (releases.length === 0) return <p>No released substance is recorded.</p>;
  return (
    <RuledTable label="Released substances and their limits" heads={['Substance', 'CAS', 'Cancer', 'Limits']}>
      {releases.map((each) => (
        <tr key={each.substance} className="border-b border-rule align-top">
          <th scope="row" className="p-2 text-left align-top">
            <Link href={`/substances/${each.substance}`} prefetch={false}>
              {each.name}
            </Link>
          </th>
          <td className="figure p-2">{each.cas ?? '—'}</td>
          <td className="p-2">{each.carcinogen ?? '—'}</td>
          <td className="p-2">
            <Limits limits={each.limits} />
          </td>
        </tr>
      ))}
    </RuledTable>
  );
}
