'use client';

import { useState } from 'react';
import { ControlLine } from '@/components/ui/control-line';
import { Notice } from '@/components/ui/notice';
import { RuledTable } from '@/components/ui/ruled-table';
import type { ControlAnswer } from '@/lib/entries/vocabulary';
import type { CopeAnswer, MatrixAnswer } from '@/lib/workshops/cope-schema';
import type { Plan } from '@/lib/workshops/plan-schema';
import { Coped, verdictWords } from './coped';
import { usePosted } from './use-posted';

function Cell({ cell, onOpen }: { cell: CopeAnswer; onOpen: () => void }) {
  return (
    <td className="p-2 align-top">
      <ControlLine control={cell.control as ControlAnswer} />
      <button type="button" onClick={onOpen} className="text-left underline">
        {verdictWords(cell)}
      </button>
    </td>
  );
}

/** A cell with what would mend it, which is asked for only now. */
function Opened({ plan, cell }: { plan: Plan; cell: CopeAnswer }) {
  const { station, materials, process } = cell;
  const { data } = usePosted<CopeAnswer>('/api/workshops/cope', {
    workshop: plan,
    station,
    material: materials,
    process,
  });
  const isIts = data?.station === station && data.materials.join() === materials.join();
  return <Coped answer={isIts ? data : cell} />;
}

/** Every station against the usual materials: which control, and whether it copes. On paper a sheet for the wall. */
export function Matrix({ plan }: { plan: Plan }) {
  const ready = (plan.stations ?? []).some(({ name, process }) => name && process) && (plan.materials ?? []).length > 0;
  const { data, error } = usePosted<MatrixAnswer>('/api/workshops/matrix', ready ? { workshop: plan } : null);
  const [open, setOpen] = useState<{ row: number; column: number } | null>(null);
  const chosen = open && data?.rows[open.row]?.cells[open.column];
  return (
    <section aria-labelledby="matrix" className="mt-8 space-y-3">
      <h2 id="matrix">Does mine cope?</h2>
      {!ready && <p>Once there is a station with a process and a usual material, each pair is answered here.</p>}
      {error && <Notice kind="fault">It cannot be reckoned as it stands. {error.message}</Notice>}
      {ready && data && (
        <RuledTable label="Stations and materials" heads={['Station', ...data.materials.map(({ title }) => title)]}>
          {data.rows.map((row, i) => (
            <tr key={row.station} className="border-b border-rule">
              <th scope="row" className="p-2 text-left align-top">
                {row.station}
                <span className="block font-normal text-quiet">{row.processTitle}</span>
              </th>
              {row.cells.map((cell, j) => (
                <Cell key={cell.materials.join()} cell={cell} onOpen={() => setOpen({ row: i, column: j })} />
              ))}
            </tr>
          ))}
        </RuledTable>
      )}
      {chosen && (
        <div className="panel" aria-live="polite">
          <h3>
            {chosen.station}: {data!.materials[open.column]!.title}
          </h3>
          <Opened plan={plan} cell={chosen} />
        </div>
      )}
    </section>
  );
}
