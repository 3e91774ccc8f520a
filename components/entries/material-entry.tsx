import { releasesOf } from '@/lib/check/releases-of';
import { rungOf, verdictOf } from '@/lib/check/rules';
import type { EntryView } from '@/lib/entries/entry-view';
import type { Library } from '@/lib/entries/library';
import type { Material, Process } from '@/lib/entries/schema';
import { Emissions } from './emissions';
import { EntryPage } from './entry-page';
import { MaterialPlate } from './material-plate';
import { OtherMaterials } from './other-materials';
import { PairCells } from './pair-cells';
import { PairsTable } from './pairs-table';
import { ReleasedTable } from './released-table';

const processOf = (library: Library, slug: string) =>
  library.byKey.get(`process:${slug}`)?.frontMatter as Process | undefined;

/** A material: its pairs with their controls, what they release against the limits, what it may be mistaken for. */
export function MaterialEntry({ view, library }: { view: EntryView; library: Library }) {
  const it = view.entry.frontMatter as Material;
  const { slug } = view.entry;
  const rows = it.pairs
    .map((pair) => ({
      process: pair.process,
      name: view.names[`process:${pair.process}`] ?? pair.process,
      control: pair.control,
      rung: rungOf(pair.control),
      cells: <PairCells material={slug} pair={pair} names={view.names} sources={it.sources} />,
    }))
    .sort((a, b) => b.rung - a.rung || a.name.localeCompare(b.name));
  const verdicts = it.pairs.map((pair) => verdictOf(slug, it, processOf(library, pair.process), pair.process));
  const facts = (
    <section aria-labelledby="pairs">
      <h2 id="pairs">Processes and the control each needs</h2>
      {rows.length === 0 ? (
        <p>No process has been reviewed for it: treat each as prohibited.</p>
      ) : (
        <PairsTable rows={rows} label="Processes and controls" />
      )}
    </section>
  );
  const after = (
    <>
      <section aria-labelledby="released" className="mt-8">
        <h2 id="released">What comes off, against its limits</h2>
        <ReleasedTable releases={releasesOf(library, verdicts)} />
      </section>
      <Emissions it={it} names={view.names} />
      <OtherMaterials it={it} names={view.names} />
    </>
  );
  const plate = <MaterialPlate entry={view.entry} it={it} names={view.names} />;
  return <EntryPage view={view} kindWord={`Material · ${it.family}`} plate={plate} facts={facts} after={after} />;
}
