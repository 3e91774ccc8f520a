import { Quantity } from '@/components/ui/quantity';
import { RuledTable } from '@/components/ui/ruled-table';
import type { Limit } from '@/lib/entries/schema';
import { Citations } from './citations';

const BASES: Record<Limit['basis'], string> = {
  TWA: 'Average over a shift (TWA)',
  STEL: 'Short-term (STEL)',
  ceiling: 'Ceiling, never above',
  IDLH: 'Immediately dangerous (IDLH)',
};

function LimitRow({ limit, sources }: { limit: Limit; sources: string[] }) {
  const past = Boolean(limit.supersededBy);
  return (
    <tr className={`border-b border-rule align-top ${past ? 'text-quiet' : ''}`}>
      <th scope="row" className="p-2 text-left align-top font-semibold">
        {limit.authority}
      </th>
      <td className="p-2">
        {BASES[limit.basis]}
        {limit.averaging && `, ${limit.averaging}`}
        {limit.as && ` (${limit.as})`}
      </td>
      <td className="p-2">
        {past ? (
          <s>
            <Quantity kind="concentration" value={limit.value} unit={limit.unit} />
          </s>
        ) : (
          <Quantity kind="concentration" value={limit.value} unit={limit.unit} />
        )}
      </td>
      <td className="p-2">
        {past && `Superseded: ${limit.supersededBy}. `}
        {limit.date}
        <Citations ids={[limit.source]} sources={sources} provenance={limit.provenance} note={limit.note} />
      </td>
    </tr>
  );
}

/** Exposure limits with who set them; superseded ones stay, struck through. */
export function LimitsTable({ limits, sources, note }: { limits: Limit[]; sources: string[]; note?: string }) {
  return (
    <section aria-labelledby="limits" className="mt-8">
      <h2 id="limits">Exposure limits</h2>
      {limits.length === 0 ? (
        <p className="mt-2">No numeric limit is recorded here. That is not permission: it is a gap.</p>
      ) : (
        <RuledTable label="Table of exposure limits" heads={['Body', 'Kind', 'Value', 'Source and note']}>
          {limits.map((limit, i) => (
            <LimitRow key={i} {...{ limit, sources }} />
          ))}
        </RuledTable>
      )}
      {note && <p className="mt-2 max-w-measure">{note}</p>}
      <p className="mt-2 max-w-measure text-quiet">
        Limits are for healthy adults over a working shift. They do not speak for children, for homes or for 24 hours.
      </p>
    </section>
  );
}
