import Link from 'next/link';
import { ReleaseFigure } from '@/components/figures/release-figure';
import { RuledTable } from '@/components/ui/ruled-table';
import { figure } from '@/lib/units/show';
import { limitWords } from '@/lib/worksheets/limit-words';
import type { ReleaseResult } from '@/lib/worksheets/release/schema';
import type { ResultProps } from '../answer';

export function ReleaseView({ result }: ResultProps<ReleaseResult>) {
  const { massLost, elements, releases } = result;
  const shares = elements.map(({ symbol, massFraction }) => `${symbol} ${figure(100 * massFraction)} %`).join(', ');
  return (
    <div className="space-y-4">
      <div className="space-y-1">
        <h3>Turned to gas and smoke</h3>
        <p className="figure asked" data-result="massLost">
          {figure(massLost)}
          <span className="unit">{'\u2009g'}</span>
        </p>
      </div>
      {shares && <p>By mass it holds {shares}.</p>}
      <RuledTable
        label="What could come off at most"
        heads={['Substance', 'Mass at most', 'In the room at most', 'Limit', 'Times the limit']}
      >
        {releases.map(({ substance, name, massAtMost, concentrationAtMost, ppmAtMost, limit, ofLimit }) => (
          <tr key={substance} className="border-b border-rule align-top">
            <th scope="row" className="p-2 text-left">
              <Link href={`/substances/${substance}`} prefetch={false}>
                {name}
              </Link>
            </th>
            <td className="figure p-2">{figure(massAtMost)} g</td>
            <td className="figure p-2">
              {concentrationAtMost ? `${figure(concentrationAtMost.value)} mg/m³ (${figure(ppmAtMost ?? 0)} ppm)` : '—'}
            </td>
            <td className="p-2">{limit ? limitWords(limit) : '—'}</td>
            <td className="figure p-2">{ofLimit === undefined ? '—' : figure(ofLimit)}</td>
          </tr>
        ))}
      </RuledTable>
      <ReleaseFigure result={result} />
    </div>
  );
}
