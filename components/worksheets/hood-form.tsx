import type { FormEventHandler, Ref } from 'react';
import { ErrorList } from '@/components/forms/error-list';
import { SubmitButton } from '@/components/forms/submit-button';
import type { FieldFault } from '@/lib/outcome';
import { HOOD_ADDRESS, type Typed } from '@/lib/worksheets/hood-airflow/address';
import { namedFaults } from '@/lib/worksheets/hood-airflow/faults';
import { CaptureClasses } from './capture-classes';
import { HoodChoice } from './hood-choice';
import { HoodNumbers } from './hood-numbers';
import { UnitsLinks } from './units-links';
import { WorkChoice } from './work-choice';

type Props = {
  typed: Typed;
  faults: readonly FieldFault[];
  /** Whether the faults are listed above as well: not while somebody types. */
  listed: boolean;
  ref?: Ref<HTMLFormElement>;
  onChange?: FormEventHandler<HTMLFormElement>;
};

/** The question. A plain GET form: what is typed stands in the address, with or without scripts. */
export function HoodForm({ typed, faults, listed, ref, onChange }: Props) {
  return (
    <form ref={ref} action={`${HOOD_ADDRESS}#answer`} onInput={onChange} className="group/hood space-y-6">
      {listed && <ErrorList errors={namedFaults(faults)} />}
      <HoodChoice chosen={typed.hood} error={faults.find(({ path }) => path === 'hood')?.message} />
      <WorkChoice chosen={typed.work} />
      <div className="space-y-3">
        <HoodNumbers typed={typed} faults={faults} />
        <CaptureClasses system={typed.units} />
      </div>
      <input type="hidden" name="units" value={typed.units} />
      <div className="flex flex-wrap items-center gap-4">
        <SubmitButton>Reckon</SubmitButton>
        <UnitsLinks typed={typed} />
      </div>
    </form>
  );
}
