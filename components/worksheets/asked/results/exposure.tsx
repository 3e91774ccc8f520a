import Link from 'next/link';
import { RuledTable } from '@/components/ui/ruled-table';
import { figure } from '@/lib/units/show';
import { limitWords } from '@/lib/worksheets/limit-words';
import type { ExposureResult } from '@/lib/worksheets/exposure/schema';
import type { ResultProps } from '../answer';

export function ExposureView({ result }: ResultProps<ExposureResult>) {
  const { sum, items, within } = result;
  return (
    <div className="space-y-4">
      <div className="space-y-1">
        <h3>The shares add up to</h3>
        <p className="figure asked" data-result="sum">
          {figure(sum)}
        </p>
        <p className={within ? undefined : 'font-semibold text-kiln'}>
          {within ? 'At most 1: by this sum the limit is not passed.' : 'Above 1: by this sum the limit is passed.'}
        </p>
      </div>
      <RuledTable label="Shares of the limits" heads={['Substance', 'Limit', 'Share']}>
        {items.map(({ substance, ratio, limit }, i) => (
          <tr key={`${i} ${substance}`} className="border-b border-rule">
            <th scope="row" className="p-2 text-left">
              <Link href={`/substances/${substance}`} prefetch={false}>
                {substance.replaceAll('-', ' ')}
              </Link>
            </th>
            <td className="p-2">{limitWords(limit)}</td>
            <td className="figure p-2">{figure(ratio)}</td>
          </tr>
        ))}
      </RuledTable>
    </div>
  );
}
