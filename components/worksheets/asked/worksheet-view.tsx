'use client';

import { Suspense, useEffect, useRef, useState, type MouseEvent, type ReactNode } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { PrintLine } from '@/components/ui/print-line';
import type { FieldFault } from '@/lib/outcome';
import { inUnits } from '@/lib/worksheets/ask/request';
import { withoutRow, withRow } from '@/lib/worksheets/ask/rows';
import { paramsOf, typedFrom } from '@/lib/worksheets/ask/typed';
import { useChosenUnits } from '../use-chosen-units';
import { AskedAnswer } from './answer';
import { asks, liveResults, type AskedName } from './live-results';
import { QuestionForm } from './question-form';
import { useAnswer, type AnswerState } from './use-answer';

type Props = {
  name: AskedName;
  query: string;
  faults: FieldFault[];
  followsReader: boolean;
  date: string;
  children: ReactNode;
};

const textsOf = (form: HTMLFormElement) =>
  new URLSearchParams([...new FormData(form)].map(([name, value]): [string, string] => [name, String(value)]));

function Live({
  name,
  query,
  state: { reply, lost },
  children,
}: {
  name: AskedName;
  query: string;
  state: AnswerState;
  children: ReactNode;
}) {
  const answered = reply && 'answer' in reply ? reply : undefined;
  const refused = reply && 'faults' in reply ? reply : undefined;
  const ask = asks[name];
  const typed = typedFrom(ask, new URLSearchParams(query));
  return (
    <>
      <p role="status" className="sr-only">
        {answered && 'The answer has been reckoned anew.'}
      </p>
      {lost && <Notice kind="fault">No answer came. “Reckon” sends the question as a page of its own.</Notice>}
      {answered && (
        <Suspense fallback={children}>
          <AskedAnswer
            {...{ ask, typed }}
            question={answered.question}
            answer={answered.answer}
            Result={liveResults[name]}
          />
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

/** The worksheet at work: reckons again at every change and keeps the question in the address. `children` is the first answer. */
export function WorksheetView({ name, query: first, faults: firstFaults, followsReader, date, children }: Props) {
  const ask = asks[name];
  const address = `/worksheets/${name}`;
  const form = useRef<HTMLFormElement>(null);
  const [query, setQuery] = useState<string | null>(null);
  /** Counts what redraws the form: rows and units; typing does not. */
  const [drawn, setDrawn] = useState({ query: first, times: 0 });
  const typed = query === null ? null : typedFrom(ask, new URLSearchParams(query));
  const state = useAnswer(ask, typed);
  const now = () => typedFrom(ask, form.current ? textsOf(form.current) : new URLSearchParams(query ?? first));
  const redraw = (next: string) => {
    setQuery(next);
    setDrawn(({ times }) => ({ query: next, times: times + 1 }));
  };
  useChosenUnits(followsReader, (units) => redraw(paramsOf(inUnits(ask, now(), units)).toString()));
  useEffect(() => {
    if (query !== null) window.history.replaceState(null, '', `${address}?${query}`);
  }, [query, address]);
  const onRow = (event: MouseEvent<HTMLButtonElement>) => {
    event.preventDefault();
    const { name: what, value } = event.currentTarget;
    redraw(paramsOf(what === 'add' ? withRow(ask, now(), value) : withoutRow(ask, now(), value)).toString());
  };
  const faults = state.reply && 'faults' in state.reply ? state.reply.faults : [];
  const shown = typedFrom(ask, new URLSearchParams(drawn.query));
  return (
    <>
      <div className="grid items-start gap-10 lg:grid-cols-[minmax(20rem,30rem)_minmax(0,1fr)] print:block">
        <div className="no-print">
          <QuestionForm
            key={drawn.times}
            {...{ ask, address, ref: form }}
            state={{ typed: shown, faults: query === null ? firstFaults : faults, onRow }}
            listed={query === null}
            onChange={() => setQuery(paramsOf(now()).toString())}
          />
        </div>
        <section id="answer" aria-labelledby="answer-heading" className="min-w-0 space-y-4">
          <h2 id="answer-heading">Answer</h2>
          <Live {...{ name, state }} query={query ?? first}>
            {children}
          </Live>
        </section>
      </div>
      <PrintLine address={`${address}?${query ?? first}`} date={date} />
    </>
  );
}
