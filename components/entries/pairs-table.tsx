'use client';

import { useState } from 'react';
import type { ReactNode } from 'react';
import { TableScroll } from '@/components/ui/table-scroll';

/** One row as the server drew it; `process`, `rung` and `control` are what it is sorted and filtered by. */
export type PairRowView = { process: string; name: string; control: string; rung: number; cells: ReactNode };

const SORTS = { process: 'Process', control: 'Control' } as const;
type Sort = keyof typeof SORTS;

const compare = (sort: Sort, a: PairRowView, b: PairRowView) =>
  sort === 'process' ? a.name.localeCompare(b.name) : b.rung - a.rung || a.name.localeCompare(b.name);

function SortHead({ sort, active, flip, onSort }: { sort: Sort; active: boolean; flip: boolean; onSort: () => void }) {
  return (
    <th scope="col" aria-sort={active ? (flip ? 'descending' : 'ascending') : 'none'} className="p-2 text-left">
      <button type="button" onClick={onSort} className="label cursor-pointer underline decoration-dotted">
        {SORTS[sort]}
        <span aria-hidden="true">{active ? (flip ? ' ↓' : ' ↑') : ''}</span>
      </button>
    </th>
  );
}

/** The pairs of a material: each row can be linked to; scripts add sorting and a filter by control. */
export function PairsTable({ rows, label }: { rows: PairRowView[]; label: string }) {
  const [order, setOrder] = useState<{ sort: Sort; flip: boolean }>({ sort: 'control', flip: false });
  const [control, setControl] = useState('');
  const controls = [...new Set(rows.map((row) => row.control))];
  const shown = rows
    .filter((row) => !control || row.control === control)
    .sort((a, b) => compare(order.sort, a, b) * (order.flip ? -1 : 1));
  const sortBy = (sort: Sort) => setOrder((now) => ({ sort, flip: now.sort === sort && !now.flip }));
  return (
    <>
      {controls.length > 1 && (
        <label className="no-print mb-2 flex items-center gap-2">
          <span className="label">Show</span>
          <select className="input w-auto" value={control} onChange={(event) => setControl(event.target.value)}>
            <option value="">every control</option>
            {controls.map((each) => (
              <option key={each}>{each}</option>
            ))}
          </select>
        </label>
      )}
      <TableScroll label={label}>
        <table className="w-full min-w-[36rem] border-collapse">
          <thead>
            <tr className="border-b-2 border-ink">
              {(['process', 'control'] as const).map((sort) => (
                <SortHead
                  key={sort}
                  {...{ sort, flip: order.flip, active: order.sort === sort }}
                  onSort={() => sortBy(sort)}
                />
              ))}
              <th scope="col" className="label p-2 text-left">
                Released
              </th>
            </tr>
          </thead>
          <tbody>
            {shown.map((row) => (
              <tr
                key={row.process}
                id={`pair-${row.process}`}
                className="border-b border-rule align-top target:bg-brass/15"
              >
                {row.cells}
              </tr>
            ))}
          </tbody>
        </table>
      </TableScroll>
    </>
  );
}
