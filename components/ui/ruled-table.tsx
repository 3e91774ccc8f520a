import type { ReactNode } from 'react';
import { TableScroll } from './table-scroll';

type Props = { label: string; heads: readonly string[]; children: ReactNode };

/** A wide table with its heads; `children` are the rows. On a narrow screen it scrolls by itself. */
export function RuledTable({ label, heads, children }: Props) {
  return (
    <TableScroll label={label}>
      <table className="mt-2 w-full min-w-[34rem] border-collapse">
        <thead>
          <tr className="label border-b-2 border-ink text-left">
            {heads.map((head) => (
              <th key={head} scope="col" className="p-2">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </TableScroll>
  );
}
