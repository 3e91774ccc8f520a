import { Suspense, type ReactNode } from 'react';
import { Notice } from '@/components/ui/notice';
import { namedFaults } from '@/lib/worksheets/ask/faults';
import { isBlank, typedFrom } from '@/lib/worksheets/ask/typed';
import { AskedAnswer } from './answer';
import { asks, liveResults, type AskedName } from './live-results';
import { NoAnswer } from './no-answer';
import type { AnswerState } from './use-answer';

type Props = { name: AskedName; query: string; state: AnswerState; children: ReactNode };

/** The answer to what stands in the form now, in place of the one the page came with. */
export function Live({ name, query, state: { reply, lost }, children }: Props) {
  const ask = asks[name];
  const typed = typedFrom(ask, new URLSearchParams(query));
  if (isBlank(typed))
    return (
      <NoAnswer typed={typed} title="Nothing asked yet">
        <p>Fill in the form; the answer then stands here.</p>
      </NoAnswer>
    );
  const answered = reply && 'answer' in reply ? reply : undefined;
  const refused = reply && 'faults' in reply ? reply : undefined;
  return (
    <>
      <p role="status" className="sr-only">
        {answered && <span key={JSON.stringify(answered.question)}>The answer has been reckoned anew.</span>}
      </p>
      {lost && <Notice kind="fault">No answer came. “Reckon” sends the question as a page of its own.</Notice>}
      {answered && (
        <Suspense fallback={children}>
          <AskedAnswer {...{ ask, typed }} {...answered} Result={liveResults[name]} />
        </Suspense>
      )}
      {refused && (
        <NoAnswer typed={typed} title="No answer yet">
          <ul className="list-disc pl-5">
            {namedFaults(ask, [...refused.missing, ...refused.faults]).map(({ path, message }) => (
              <li key={`${path} ${message}`}>{message}</li>
            ))}
          </ul>
        </NoAnswer>
      )}
      {!answered && !refused && children}
    </>
  );
}
