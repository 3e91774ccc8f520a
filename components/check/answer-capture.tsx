import Link from 'next/link';
import { Quantity } from '@/components/ui/quantity';
import type { CheckView } from '@/lib/search/ask-check';
import { hoodWorksheetUrl } from '@/lib/worksheets/hood-airflow/from-capture';

/** The capture and the airflow computed from it; for what may not be run, why none is given. */
export function AnswerCapture({ view: { answer, process, materials } }: { view: CheckView }) {
  const stated = materials
    .flatMap((it) => it.pairs)
    .find((pair) => pair.process === answer.process && pair.capture)?.capture;
  const capture = stated ?? process?.capture;
  return (
    <section aria-labelledby="capture" className="max-w-measure">
      <h2 id="capture">Capture and airflow</h2>
      {answer.capture && capture ? (
        <>
          <p className="mt-2">
            {answer.capture.hood.replaceAll('-', ' ')} at{' '}
            <Quantity kind="velocity" min={answer.capture.velocity.min} max={answer.capture.velocity.max} />
            {answer.capture.distance !== null && (
              <>
                , <Quantity kind="length" value={answer.capture.distance} /> away
              </>
            )}
            : <Quantity kind="airflow" min={answer.capture.airflow.min} max={answer.capture.airflow.max} />, computed by{' '}
            <span className="figure whitespace-normal">{answer.capture.equation}</span>.
          </p>
          <p className="mt-1">
            <Link href={hoodWorksheetUrl(capture)} prefetch={false}>
              Open the working, and put in your own hood
            </Link>
          </p>
        </>
      ) : (
        <p className="mt-2">
          {answer.control === 'prohibited'
            ? 'None is given: no airflow makes a prohibited pair acceptable.'
            : 'None is given for what is not identified or not stated.'}
        </p>
      )}
    </section>
  );
}
