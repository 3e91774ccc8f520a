import Link from 'next/link';
import { Panel } from '@/components/ui/panel';
import { Quantity } from '@/components/ui/quantity';
import type { PublishedEntry } from '@/lib/entries/library';
import type { Process } from '@/lib/entries/schema';
import { airflowOfCapture, hoodWorksheetUrl } from '@/lib/worksheets/hood-airflow/from-capture';
import { ReviewLines } from './review-lines';
import { PlateLine, Stated } from './stated';

const SIZES = [
  ['distance', 'Distance', 'length'],
  ['diameter', 'Diameter', 'length'],
  ['width', 'Width', 'length'],
  ['height', 'Height', 'length'],
  ['openArea', 'Open area', 'area'],
  ['perimeter', 'Perimeter', 'length'],
] as const;

/** Velocity times area: what the recommended airflow comes to. It is computed here and never typed into an entry. */
function Airflow({ it }: { it: Process }) {
  const airflow = airflowOfCapture(it.capture);
  if (!airflow) return null;
  return (
    <PlateLine term="Airflow, computed">
      <span className="asked">
        <Quantity kind="airflow" min={airflow.min} max={airflow.max} />
      </span>
      <span className="figure block whitespace-normal">{airflow.equation}</span>
      <Link href={hoodWorksheetUrl(it.capture)} prefetch={false}>
        Open the working with these numbers
      </Link>
    </PlateLine>
  );
}

/** A process's data plate: the hood, the velocity at the source, the airflow that follows. */
export function ProcessPlate({ entry, it }: { entry: PublishedEntry; it: Process }) {
  const { capture, sources } = it;
  return (
    <Panel title="Data plate" look="plate">
      <dl>
        <PlateLine term="Usual control">{it.usual}</PlateLine>
        {capture.releaseCondition && <PlateLine term="Release">{capture.releaseCondition}</PlateLine>}
        <PlateLine term={capture.hood === 'enclosure' ? 'Opening velocity' : 'Capture velocity'}>
          <Stated kind="velocity" of={capture.velocity} sources={sources} />
        </PlateLine>
        <PlateLine term="Hood">{capture.hood.replaceAll('-', ' ')}</PlateLine>
        {SIZES.map(([field, term, kind]) => {
          const size = capture[field];
          return size ? (
            <PlateLine key={field} term={term}>
              <Stated kind={kind} of={size} sources={sources} />
            </PlateLine>
          ) : null;
        })}
        <Airflow it={it} />
        <ReviewLines entry={entry} />
      </dl>
    </Panel>
  );
}
