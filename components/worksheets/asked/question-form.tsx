import type { FormEventHandler, Ref } from 'react';
import Link from 'next/link';
import { ErrorList } from '@/components/forms/error-list';
import { SubmitButton } from '@/components/forms/submit-button';
import { SYSTEMS, type System } from '@/lib/units/kinds';
import { namedFaults } from '@/lib/worksheets/ask/faults';
import type { Ask, GroupAsk } from '@/lib/worksheets/ask/fields';
import { inUnits } from '@/lib/worksheets/ask/request';
import { paramsOf, type Typed } from '@/lib/worksheets/ask/typed';
import { AskedFields } from './field-of';
import type { FormState } from './form-state';

const NAMES: Record<System, string> = { si: 'SI units', us: 'US customary units' };

const isFilled = ({ fields }: GroupAsk, { texts }: Typed) =>
  [...texts].some(
    ([path, all]) =>
      all.some(Boolean) && fields.some((field) => path === field.path || path.startsWith(`${field.path}.`)),
  );

function Group({ group, state }: { group: GroupAsk; state: FormState }) {
  const fields = (
    <div className="mt-2 grid gap-4 sm:grid-cols-2">
      <AskedFields fields={group.fields} state={state} />
    </div>
  );
  const help = group.help && <p className="text-base text-quiet">{group.help}</p>;
  if (group.folded)
    return (
      <details open={isFilled(group, state.typed) || undefined}>
        <summary className="text-lg font-semibold">{group.title}</summary>
        {help}
        {fields}
      </details>
    );
  return (
    <fieldset>
      <legend className="text-lg font-semibold">{group.title}</legend>
      {help}
      {fields}
    </fieldset>
  );
}

type Props = {
  ask: Ask;
  state: FormState;
  /** Whether the faults are listed above as well: not while somebody types. */
  listed: boolean;
  address: string;
  ref?: Ref<HTMLFormElement>;
  onChange?: FormEventHandler<HTMLFormElement>;
};

/** The question. A plain GET form: what is typed stands in the address, with or without scripts. */
export function QuestionForm({ ask, state, listed, address, ref, onChange }: Props) {
  const { typed, faults } = state;
  return (
    <form ref={ref} action={`${address}#answer`} onInput={onChange} className="space-y-7">
      {listed && <ErrorList errors={namedFaults(ask, faults)} />}
      {/* Enter in a field sends the question: the first button of a form is the one it presses. */}
      <button type="submit" tabIndex={-1} aria-hidden="true" className="sr-only">
        Reckon
      </button>
      {ask.groups.map((group) => (
        <Group key={group.title} group={group} state={state} />
      ))}
      <input type="hidden" name="units" value={typed.units} />
      <div className="no-print flex flex-wrap items-center gap-4">
        <SubmitButton>Reckon</SubmitButton>
        {SYSTEMS.filter((system) => system !== typed.units).map((system) => (
          <Link
            key={system}
            href={`${address}?${paramsOf(inUnits(ask, typed, system))}`}
            prefetch={false}
            scroll={false}
          >
            Use {NAMES[system]}
          </Link>
        ))}
      </div>
    </form>
  );
}
