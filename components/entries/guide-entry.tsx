import { Panel } from '@/components/ui/panel';
import type { EntryView } from '@/lib/entries/entry-view';
import type { Library } from '@/lib/entries/library';
import { EntryPage } from './entry-page';
import { ReviewLines } from './review-lines';

/** A guide: a question people ask, answered. */
export function GuideEntry({ view }: { view: EntryView; library: Library }) {
  const plate = (
    <Panel title="Data plate" look="plate">
      <dl>
        <ReviewLines entry={view.entry} />
      </dl>
    </Panel>
  );
  return <EntryPage view={view} kindWord="Guide" plate={plate} />;
}
