import { RuledTable } from '@/components/ui/ruled-table';
import { MONOXIDE_LEVELS } from '@/lib/air/carbon-monoxide';

/** What bodies say of carbon monoxide, each named as the one that set it: none of them is a line between harm and none. */
export function MonoxideLevels() {
  return (
    <details>
      <summary className="font-semibold">Levels of carbon monoxide, and who set them</summary>
      <RuledTable label="Levels of carbon monoxide" heads={['Body', 'Level', 'Over', 'Source']}>
        {MONOXIDE_LEVELS.map(({ body, value, unit, over, source }) => (
          <tr key={`${body} ${value}`} className="border-b border-rule">
            <th scope="row" className="p-2 text-left">
              {body}
            </th>
            <td className="figure p-2">
              {value} {unit.replace('m3', 'm³')}
            </td>
            <td className="p-2">{over}</td>
            <td className="p-2 text-quiet">{source}</td>
          </tr>
        ))}
      </RuledTable>
    </details>
  );
}
