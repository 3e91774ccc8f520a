import { ControlLine } from '@/components/ui/control-line';
import { Panel } from '@/components/ui/panel';
import type { EntryNames } from '@/lib/entries/entry-names';
import type { PublishedEntry } from '@/lib/entries/library';
import type { Material } from '@/lib/entries/schema';
import { Citations } from './citations';
import { ReviewLines } from './review-lines';
import { PlateLine, Stated } from './stated';

function Composition({ it }: { it: Material }) {
  const { formula, parts = [], concern, note, source, provenance } = it.composition;
  return (
    <PlateLine term="Made of">
      {formula && <span className="figure">{formula}</span>}
      {parts.map(({ name, formula: part, share }) => (
        <span key={name} className="block">
          {name} {part && <span className="figure">{part}</span>} {share}
        </span>
      ))}
      <span className="block">
        {concern.length > 0 ? `Elements of concern: ${concern.join(', ')}` : 'No element of concern beyond C, H and O'}
        <Citations ids={[source]} sources={it.sources} provenance={provenance} note={note} />
      </span>
    </PlateLine>
  );
}

/** A material's data plate: what it is, its pairs by control, who reviewed it. */
export function MaterialPlate({ entry, it, names }: { entry: PublishedEntry; it: Material; names: EntryNames }) {
  return (
    <Panel title="Data plate" look="plate">
      <ul className="mb-3 space-y-1.5">
        {it.pairs.map((pair) => (
          <li key={pair.process}>
            <a href={`#pair-${pair.process}`} className="font-semibold">
              {names[`process:${pair.process}`] ?? pair.process}
            </a>
            <ControlLine control={pair.control} />
          </li>
        ))}
      </ul>
      <dl>
        {it.abbreviation && <PlateLine term="Abbreviation">{it.abbreviation}</PlateLine>}
        {it.cas && (
          <PlateLine term="CAS">
            <span className="figure">{it.cas}</span>
          </PlateLine>
        )}
        <Composition it={it} />
        {it.density && (
          <PlateLine term="Density">
            <Stated kind="density" of={it.density} sources={it.sources} />
          </PlateLine>
        )}
        {it.temperatures?.map(({ event, at }) => (
          <PlateLine key={event} term={event[0]!.toUpperCase() + event.slice(1)}>
            <Stated kind="temperature" of={at} sources={it.sources} />
          </PlateLine>
        ))}
        <ReviewLines entry={entry} />
      </dl>
    </Panel>
  );
}
