'use client';

import {
  memo,
  startTransition,
  useCallback,
  useDeferredValue,
  useEffect,
  useMemo,
  useRef,
  useState,
  type MouseEvent,
  type ReactNode,
} from 'react';
import { PrintLine } from '@/components/ui/print-line';
import type { FieldFault } from '@/lib/outcome';
import { inUnits } from '@/lib/worksheets/ask/request';
import { withoutRow, withRow } from '@/lib/worksheets/ask/rows';
import { isBlank, paramsOf, typedFrom } from '@/lib/worksheets/ask/typed';
import { useChosenUnits } from '../use-chosen-units';
import { Live } from './live';
import { asks, type AskedName } from './live-results';
import { QuestionForm } from './question-form';
import { useAnswer } from './use-answer';
import { useRowFocus } from './use-row-focus';

type Props = {
  name: AskedName;
  query: string;
  faults: FieldFault[];
  followsReader: boolean;
  date: string;
  children: ReactNode;
};

const NONE: FieldFault[] = [];

const textsOf = (form: HTMLFormElement) =>
  new URLSearchParams([...new FormData(form)].map(([name, value]): [string, string] => [name, String(value)]));

/** How long typing must rest before the question is asked. */
const REST_MS = 200;
/** A form of a hundred fields is drawn again only where a row, the units or a fault has changed, never for a key that is pressed. */
const Form = memo(QuestionForm);

/** The worksheet at work: reckons again at every change and keeps the question in the address. `children` is the first answer. */
export function WorksheetView({ name, query: first, faults: firstFaults, followsReader, date, children }: Props) {
  const ask = asks[name];
  const address = `/worksheets/${name}`;
  const form = useRef<HTMLFormElement>(null);
  const [query, setQuery] = useState<string | null>(null);
  /** Counts what redraws the form: rows and units; typing does not. */
  const [drawn, setDrawn] = useState({ query: first, times: 0 });
  const typed = query === null ? null : typedFrom(ask, new URLSearchParams(query));
  const state = useAnswer(ask, typed && !isBlank(typed) ? typed : null);
  const now = () => typedFrom(ask, form.current ? textsOf(form.current) : new URLSearchParams(query ?? first));
  const redraw = useCallback((next: string) => {
    setQuery(next);
    setDrawn(({ times }) => ({ query: next, times: times + 1 }));
  }, []);
  useChosenUnits(followsReader, (units) => redraw(paramsOf(inUnits(ask, now(), units)).toString()));
  useEffect(() => {
    if (query !== null) window.history.replaceState(null, '', `${address}?${query}`);
  }, [query, address]);
  const willMove = useRowFocus(drawn.times);
  const onRow = useCallback(
    (event: MouseEvent<HTMLButtonElement>) => {
      event.preventDefault();
      const { name: what, value } = event.currentTarget;
      willMove({ what, path: value });
      const typedNow = typedFrom(ask, textsOf(event.currentTarget.form!));
      redraw(paramsOf(what === 'add' ? withRow(ask, typedNow, value) : withoutRow(ask, typedNow, value)).toString());
    },
    [ask, redraw, willMove],
  );
  const rest = useRef<ReturnType<typeof setTimeout>>(undefined);
  const onChange = useCallback(() => {
    clearTimeout(rest.current);
    rest.current = setTimeout(() => {
      if (!form.current) return;
      const next = paramsOf(typedFrom(ask, textsOf(form.current))).toString();
      startTransition(() => setQuery(next));
    }, REST_MS);
  }, [ask]);
  useEffect(() => () => clearTimeout(rest.current), []);
  // The answer is drawn in small pieces between frames, so that typing never waits for it.
  const settled = useDeferredValue(state);
  const given = query === null ? firstFaults : settled.reply && 'faults' in settled.reply ? settled.reply.faults : NONE;
  const formState = useMemo(
    () => ({ typed: typedFrom(ask, new URLSearchParams(drawn.query)), faults: given, onRow }),
    [ask, drawn, given, onRow],
  );
  return (
    <>
      <div className="grid items-start gap-10 lg:grid-cols-[minmax(20rem,30rem)_minmax(0,1fr)] print:block">
        <div className="no-print">
          <Form
            key={drawn.times}
            {...{ ask, address, ref: form, onChange }}
            state={formState}
            listed={query === null}
          />
        </div>
        <section id="answer" aria-labelledby="answer-heading" className="min-w-0 space-y-4">
          <h2 id="answer-heading">Answer</h2>
          {query === null ? children : <Live {...{ name, query, children }} state={settled} />}
        </section>
      </div>
      <PrintLine address={`${address}?${query ?? first}`} date={date} />
    </>
  );
}
