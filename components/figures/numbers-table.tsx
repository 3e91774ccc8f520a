import { TableScroll } from '@/components/ui/table-scroll';

type Props = { caption: string; heads: readonly string[]; rows: readonly (readonly string[])[]; open?: boolean };

/** The numbers behind a drawing, one click away. */
export function NumbersTable({ caption, heads, rows, open }: Props) {
  return (
    <details open={open}>
      <summary className="font-semibold">The same numbers as a table</summary>
      <TableScroll label={caption}>
        <table className="mt-3">
          <caption>{caption}</caption>
          <thead>
            <tr>
              {heads.map((head) => (
                <th key={head} scope="col" className="px-2 text-left">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row, i) => (
              <tr key={i}>
                {row.map((cell, j) => (
                  <td key={j} className="figure px-2">
                    {cell}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </TableScroll>
    </details>
  );
}
