import Link from 'next/link';
import { RuledTable } from '@/components/ui/ruled-table';
import { figure, told } from '@/lib/units/show';
import type { Plan } from '@/lib/workshops/plan-schema';
import { upkeepOf, type Upkeep } from '@/lib/workshops/upkeep';

const shown = ({ kind }: Upkeep, value: number) =>
  told(kind === 'face-velocity' ? 'velocity' : 'pressure', value, 'si');

function stateOf({ outOfUse, overdue, due }: Upkeep): string {
  if (outOfUse) return 'Out of use until it is mended';
  return overdue ? `Overdue since ${due}` : `Next reading ${due}`;
}

/** How each exhaust has drifted from its baseline, and when it is read next. */
export function UpkeepList({ plan, today }: { plan: Plan; today: string }) {
  const all = upkeepOf(plan, today);
  return (
    <section aria-labelledby="upkeep" className="mt-8 space-y-3">
      <h2 id="upkeep">Upkeep</h2>
      <p>
        A tenth of a change wants a look, a fifth puts an exhaust out of use (common practice, no source).{' '}
        <Link href="/guides/proving-extraction">How to measure</Link>
      </p>
      {all.length > 0 && (
        <RuledTable label="Readings against their baseline" heads={['Exhaust', 'Baseline', 'Last', 'Drift', 'State']}>
          {all.map((each) => (
            <tr key={`${each.exhaust} ${each.kind}`} className="border-b border-rule">
              <th scope="row" className="p-2 text-left">
                {each.exhaust}
              </th>
              <td className="figure p-2">{shown(each, each.baseline)}</td>
              <td className="p-2">
                <span className="figure">{shown(each, each.last)}</span> on {each.lastDate}
              </td>
              <td className="figure p-2">{figure(100 * each.drift)} %</td>
              <td className={`p-2 font-semibold ${each.outOfUse || each.overdue ? 'text-kiln' : ''}`}>
                {stateOf(each)}
              </td>
            </tr>
          ))}
        </RuledTable>
      )}
    </section>
  );
}
