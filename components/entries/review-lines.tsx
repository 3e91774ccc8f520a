import type { PublishedEntry } from '@/lib/entries/library';
import { PlateLine } from './stated';

/** Which revision this is, who reviewed it and when it falls due again. */
export function ReviewLines({ entry }: { entry: PublishedEntry }) {
  return (
    <>
      <PlateLine term="Revision">
        {entry.revision}, published <time dateTime={entry.publishedAt}>{entry.publishedAt.slice(0, 10)}</time>
      </PlateLine>
      <PlateLine term="Reviewed by">{entry.reviewedBy}</PlateLine>
      <PlateLine term="Review due">
        <time dateTime={entry.reviewDue}>{entry.reviewDue}</time>
      </PlateLine>
    </>
  );
}
