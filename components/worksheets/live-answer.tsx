'use client';

import { lazy, Suspense, type ReactNode } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { told } from '@/lib/units/show';
import type { Typed } from '@/lib/worksheets/hood-airflow/address';
import type { HoodState } from './use-hood-answer';

/** Drawing and working come drawn by the server at first; their code is fetched when something is changed. */
const HoodAnswer = lazy(() => import('./hood-answer').then((module) => ({ default: module.HoodAnswer })));

type Props = { typed: Typed | null; state: HoodState; children: ReactNode };

/** The answer to what is typed now; `children`, the answer the page came with, until something else is known. */
export function LiveAnswer({ typed, state: { reply, lost }, children }: Props) {
  const answered = typed && reply && 'answer' in reply ? reply : undefined;
  const refused = typed && reply && 'faults' in reply ? reply : undefined;
  return (
    <>
      <p role="status" className="sr-only">
        {answered && `The hood must draw ${told('airflow', answered.answer.result.airflow, typed!.units)}.`}
      </p>
      {lost && <Notice kind="fault">No answer came. “Reckon” sends the question as a page of its own.</Notice>}
      {answered && (
        <Suspense fallback={children}>
          <HoodAnswer typed={typed!} question={answered.question} answer={answered.answer} />
        </Suspense>
      )}
      {refused && (
        <EmptyState title="No answer yet">
          <ul className="list-disc pl-5">
            {[...refused.missing, ...refused.faults].map(({ path, message }) => (
              <li key={`${path} ${message}`}>{message}</li>
            ))}
          </ul>
        </EmptyState>
      )}
      {!answered && !refused && children}
    </>
  );
}
