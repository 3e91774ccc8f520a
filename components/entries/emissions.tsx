import { RuledTable } from '@/components/ui/ruled-table';
import type { EntryNames } from '@/lib/entries/entry-names';
import type { Material } from '@/lib/entries/schema';
import { Citations } from './citations';

/** Published amounts, each with the conditions it was measured under. Two that disagree both stand. */
export function Emissions({ it, names }: { it: Material; names: EntryNames }) {
  const emissions = it.emissions ?? [];
  if (emissions.length === 0) return null;
  return (
    <section aria-labelledby="measured" className="mt-8">
      <h2 id="measured">What has been measured</h2>
      <RuledTable label="Table of measured emissions" heads={['Process', 'Quantity', 'Value', 'Conditions and source']}>
        {emissions.map((each, i) => (
          <tr key={i} className="border-b border-rule align-top">
            <th scope="row" className="p-2 text-left align-top font-normal">
              {names[`process:${each.process}`] ?? each.process}
            </th>
            <td className="p-2">{each.quantity}</td>
            <td className="p-2">
              <span className="figure whitespace-normal">
                {each.value} <span className="unit">{each.unit}</span>
              </span>
            </td>
            <td className="p-2">
              {each.conditions}
              <Citations ids={[each.source]} sources={it.sources} provenance={each.provenance} note={each.note} />
            </td>
          </tr>
        ))}
      </RuledTable>
    </section>
  );
}
