import type { EntryView } from '@/lib/entries/entry-view';
import type { Library } from '@/lib/entries/library';
import type { Process } from '@/lib/entries/schema';
import { Claims } from './claims';
import { EntryPage } from './entry-page';
import { MaterialsOfProcess } from './materials-of-process';
import { ProcessPlate } from './process-plate';

/** A process: how it is captured, what to mind, and every material reviewed under it. */
export function ProcessEntry({ view, library }: { view: EntryView; library: Library }) {
  const it = view.entry.frontMatter as Process;
  const list = (id: string, title: string, claims: Process['cautions']) => (
    <Claims id={id} title={title} claims={claims} sources={it.sources} />
  );
  const facts = (
    <>
      {list('cautions', 'Cautions', it.cautions)}
      {list('mishap', 'If something went wrong', it.mishap)}
    </>
  );
  const after = (
    <>
      {list('protection', 'Personal protection, after every other control', it.protection)}
      {list('waste', 'Waste', it.waste)}
      <MaterialsOfProcess slug={view.entry.slug} library={library} />
    </>
  );
  const plate = <ProcessPlate entry={view.entry} it={it} />;
  return <EntryPage view={view} kindWord="Process" plate={plate} facts={facts} after={after} />;
}
