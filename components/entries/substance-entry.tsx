import type { EntryView } from '@/lib/entries/entry-view';
import type { Library } from '@/lib/entries/library';
import type { Substance } from '@/lib/entries/schema';
import { Claims } from './claims';
import { EntryPage } from './entry-page';
import { LimitsTable } from './limits-table';
import { ReleasedBy } from './released-by';
import { SubstancePlate } from './substance-plate';

/** A substance: its limits, whether smell warns, what it does, and which pairs release it. */
export function SubstanceEntry({ view, library }: { view: EntryView; library: Library }) {
  const it = view.entry.frontMatter as Substance;
  const facts = (
    <>
      <Claims id="effects" title="What it does to people" claims={it.effects} sources={it.sources} />
      {it.symptoms.length > 0 && (
        <p className="mt-3 max-w-measure">
          <span className="label">Felt or noticed as: </span>
          {it.symptoms.join(', ')}. A symptom is a reason to leave and ask a doctor, never a way to measure.
        </p>
      )}
      <LimitsTable limits={it.limits} sources={it.sources} note={it.limitsNote} />
    </>
  );
  const plate = <SubstancePlate entry={view.entry} it={it} />;
  const after = <ReleasedBy slug={view.entry.slug} library={library} names={view.names} />;
  return <EntryPage view={view} kindWord="Substance" plate={plate} facts={facts} after={after} />;
}
