'use client';

import { useEffect, useRef, useState, type ReactNode } from 'react';
import { PrintLine } from '@/components/ui/print-line';
import type { FieldFault } from '@/lib/outcome';
import { addressOf, inUnits, typedFrom, type Typed } from '@/lib/worksheets/hood-airflow/address';
import { HoodForm } from './hood-form';
import { LiveAnswer } from './live-answer';
import { useChosenUnits } from './use-chosen-units';
import { useHoodAnswer } from './use-hood-answer';

type Props = { typed: Typed; faults: FieldFault[]; followsReader: boolean; date: string; children: ReactNode };

const textsOf = (form: HTMLFormElement) =>
  new URLSearchParams([...new FormData(form)].map(([name, value]): [string, string] => [name, String(value)]));

/** The worksheet at work: reckons again at every change and keeps the question in the address. `children` is the first answer. */
export function HoodWorksheet({ typed: first, faults: firstFaults, followsReader, date, children }: Props) {
  const form = useRef<HTMLFormElement>(null);
  const [typed, setTyped] = useState<Typed | null>(null);
  const state = useHoodAnswer(typed);
  const shown = typed ?? first;
  const asTyped = () => (form.current ? typedFrom(textsOf(form.current)) : shown);
  useChosenUnits(followsReader, (units) => setTyped(inUnits(asTyped(), units)));
  useEffect(() => {
    if (typed) window.history.replaceState(null, '', addressOf(typed));
  }, [typed]);
  const faults = state.reply && 'faults' in state.reply ? state.reply.faults : [];
  return (
    <>
      <div className="grid items-start gap-10 lg:grid-cols-[minmax(20rem,27rem)_minmax(0,1fr)] print:block">
        <HoodForm
          key={shown.units}
          ref={form}
          typed={shown}
          faults={typed ? faults : firstFaults}
          listed={!typed}
          onChange={() => setTyped(asTyped())}
        />
        <section id="answer" aria-labelledby="answer-heading" className="space-y-4">
          <h2 id="answer-heading">Answer</h2>
          <LiveAnswer typed={typed} state={state}>
            {children}
          </LiveAnswer>
        </section>
      </div>
      <PrintLine address={addressOf(shown)} date={date} />
    </>
  );
}
