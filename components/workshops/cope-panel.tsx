'use client';

import Link from 'next/link';
import { useState } from 'react';
import { Notice } from '@/components/ui/notice';
import type { CopeAnswer } from '@/lib/workshops/cope-schema';
import { offersOf, readDocument } from '@/lib/workshops/written';
import { Coped } from './coped';
import { useKept } from './use-kept';
import { usePosted } from './use-posted';

const NO_LIBRARY = { processes: [], materials: [] };

/** “Does mine cope?” beside a check: the station is chosen from the workshop that this browser keeps. */
export function CopePanel({ materials, process }: { materials: string[]; process: string }) {
  const { kept } = useKept();
  const [picked, setPicked] = useState<string | null>(null);
  const plan = kept ? readDocument(kept.document, offersOf(kept.document, NO_LIBRARY)).plan : {};
  const stations = (plan.stations ?? []).flatMap(({ name, process: done }) =>
    name ? [{ name, fits: done === process }] : [],
  );
  const station = picked ?? stations.find(({ fits }) => fits)?.name ?? '';
  const body = station ? { workshop: plan, station, material: materials, process } : null;
  const { data, error } = usePosted<CopeAnswer>('/api/workshops/cope', body);
  return (
    <section aria-labelledby="cope" className="max-w-measure space-y-3">
      <h2 id="cope">Does mine cope?</h2>
      {stations.length === 0 ? (
        <p>
          <Link href="/workshops">Describe your workshop</Link> once, and every check is held against your own hood,
          duct, fan and room. It stays in this browser.
        </p>
      ) : (
        <div className="no-print">
          <label htmlFor="cope-station" className="block font-semibold">
            Station of your workshop
          </label>
          <select
            id="cope-station"
            className="input"
            value={station}
            onChange={(event) => setPicked(event.target.value)}
          >
            <option value="">Choose</option>
            {stations.map(({ name }) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        </div>
      )}
      {error && <Notice kind="fault">It cannot be reckoned as it stands. {error.message}</Notice>}
      {station && data && data.station === station && <Coped answer={data} />}
    </section>
  );
}
