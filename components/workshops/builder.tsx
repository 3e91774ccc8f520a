'use client';

import { useRef, useState, type MouseEvent } from 'react';
import { AskedFields } from '@/components/worksheets/asked/field-of';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { Option } from '@/lib/worksheets/ask/fields';
import { withoutRow, withRow } from '@/lib/worksheets/ask/rows';
import { faultsForReader } from '@/lib/worksheets/ask/faults';
import { paramsOf, typedFrom } from '@/lib/worksheets/ask/typed';
import { workshopAsk } from '@/lib/workshops/ask';
import { exampleDocument } from '@/lib/workshops/example';
import { offersOf, readDocument } from '@/lib/workshops/written';
import { Matrix } from './matrix';
import { UpkeepList } from './upkeep-list';
import { useKept, type Kept } from './use-kept';

export type LibraryOffers = { processes: readonly Option[]; materials: readonly Option[] };
type Props = { library: LibraryOffers; today: string };

const textsOf = (form: HTMLFormElement) =>
  new URLSearchParams([...new FormData(form)].map(([name, value]): [string, string] => [name, String(value)]));

type FormProps = { library: LibraryOffers; first: Kept } & Pick<ReturnType<typeof useKept>, 'save' | 'force'>;

/** The form, a step at a time. What is typed is kept as it stands, half-done or not. */
function Steps({ library, first, save, force }: FormProps) {
  const form = useRef<HTMLFormElement>(null);
  const version = useRef(first.version);
  const [drawn, setDrawn] = useState({ document: first.document, times: 0 });
  const [step, setStep] = useState(0);
  const [conflict, setConflict] = useState(false);
  const offers = offersOf(drawn.document, library);
  const ask = workshopAsk(offers);
  const { typed, faults } = readDocument(drawn.document, offers);
  const now = () => typedFrom(ask, form.current ? textsOf(form.current) : new URLSearchParams(drawn.document));
  const keep = (document: string) => {
    const saved = save(document, version.current);
    setConflict(saved === null);
    if (saved) version.current = saved.version;
  };
  const settle = (saved: Kept) => {
    version.current = saved.version;
    setConflict(false);
  };
  const redraw = (document: string) => {
    keep(document);
    setDrawn(({ times }) => ({ document, times: times + 1 }));
  };
  const onRow = (event: MouseEvent<HTMLButtonElement>) => {
    event.preventDefault();
    const { name, value } = event.currentTarget;
    redraw(paramsOf(name === 'add' ? withRow(ask, now(), value) : withoutRow(ask, now(), value)).toString());
  };
  const go = (to: number) => {
    redraw(paramsOf(now()).toString());
    setStep(to);
  };
  return (
    <>
      {conflict && (
        <Notice kind="fault">
          Another tab has saved this workshop meanwhile. Nothing here is lost:{' '}
          <Button onClick={() => window.location.reload()}>take the other one</Button>{' '}
          <Button onClick={() => settle(force(paramsOf(now()).toString()))}>keep this one</Button>
        </Notice>
      )}
      <nav aria-label="Steps" className="no-print my-4 flex flex-wrap gap-2">
        {ask.groups.map(({ title }, i) => (
          <Button
            key={title}
            aria-current={i === step ? 'step' : undefined}
            onClick={() => go(i)}
            variant={i === step ? 'primary' : 'plain'}
          >
            {`${i + 1}. ${title}`}
          </Button>
        ))}
      </nav>
      <form
        key={drawn.times}
        ref={form}
        onSubmit={(event) => event.preventDefault()}
        onInput={() => keep(paramsOf(now()).toString())}
        className="no-print"
      >
        <input type="hidden" name="units" value="si" />
        {ask.groups.map((group, i) => (
          <fieldset key={group.title} hidden={i !== step}>
            <legend className="text-lg font-semibold">{group.title}</legend>
            {group.help && <p className="text-base text-quiet">{group.help}</p>}
            <div className="mt-2 grid gap-4 sm:grid-cols-2">
              <AskedFields fields={group.fields} state={{ typed, faults: faultsForReader(ask, faults), onRow }} />
            </div>
          </fieldset>
        ))}
        <div className="mt-4 flex gap-3">
          {step > 0 && <Button onClick={() => go(step - 1)}>Back</Button>}
          {step < ask.groups.length - 1 && (
            <Button variant="primary" onClick={() => go(step + 1)}>
              Next
            </Button>
          )}
          <p role="status" className="self-center text-quiet">
            {conflict ? 'Not saved.' : 'Kept in this browser as you type.'}
          </p>
        </div>
      </form>
    </>
  );
}

type LoadedProps = Props & { kept: Kept } & Pick<ReturnType<typeof useKept>, 'save' | 'force'>;

function Loaded({ library, today, kept, save, force }: LoadedProps) {
  const [started, setStarted] = useState(kept);
  const { plan } = readDocument(kept.document, offersOf(kept.document, library));
  return (
    <>
      {kept.document === '' && (
        <p className="no-print my-4">
          Nothing is kept yet.{' '}
          <Button onClick={() => setStarted(force(exampleDocument()))}>Load an invented workshop</Button>
        </p>
      )}
      <Steps key={started.version} {...{ library, save, force }} first={started} />
      <Matrix plan={plan} />
      <UpkeepList plan={plan} today={today} />
    </>
  );
}

/** A workshop of one’s own: the form, and what follows from it. */
export function WorkshopBuilder({ library, today }: Props) {
  const { kept, save, force } = useKept();
  if (!kept) return <p>Looking for the workshop that this browser keeps …</p>;
  return <Loaded {...{ library, today, kept, save, force }} />;
}
