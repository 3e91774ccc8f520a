import { Field } from '@/components/forms/field';
import type { FieldFault } from '@/lib/outcome';
import { MAX_TYPED } from '@/lib/units/parse-quantity';
import type { Typed } from '@/lib/worksheets/hood-airflow/address';
import { NUMBERS, typedUnitOf, type NumberField } from '@/lib/worksheets/hood-airflow/fields';
import { fieldHint, fieldWords } from '@/lib/worksheets/hood-airflow/names';

const NOT_ENCLOSURE = 'group-has-[[value=enclosure]:checked]/hood:hidden';
const NOT_CANOPY = 'group-has-[[value=canopy]:checked]/hood:hidden';
const NOT_SLOT = 'group-has-[[value$=-slot]:checked]/hood:hidden';
const NOT_OPENING = 'group-has-[[value$=-opening]:checked]/hood:hidden';

/** Hides a number while a hood is ticked that is not reckoned from it: by style alone, so that it needs no script. */
const HIDDEN: Record<NumberField, string> = {
  velocity: '',
  distance: NOT_ENCLOSURE,
  diameter: `${NOT_SLOT} ${NOT_ENCLOSURE} ${NOT_CANOPY}`,
  width: `${NOT_ENCLOSURE} ${NOT_CANOPY}`,
  height: `${NOT_ENCLOSURE} ${NOT_CANOPY}`,
  openArea: `${NOT_OPENING} ${NOT_SLOT} ${NOT_CANOPY}`,
  perimeter: `${NOT_OPENING} ${NOT_SLOT} ${NOT_ENCLOSURE}`,
};

type Props = { typed: Typed; faults: readonly FieldFault[] };

/** The numbers, each with its unit beside it; one typed with another unit is understood as well. */
export function HoodNumbers({ typed, faults }: Props) {
  return (
    <fieldset className="grid gap-4 sm:grid-cols-2">
      <legend className="mb-2 font-semibold">How large, how far, how fast?</legend>
      {NUMBERS.map((field) => (
        <div key={field} className={HIDDEN[field]}>
          <Field
            name={field}
            label={`${fieldWords(field)} (${typedUnitOf(field, typed.units)})`}
            hint={fieldHint(field)}
            error={faults.find(({ path }) => path === field)?.message}
            defaultValue={typed[field]}
            inputMode="decimal"
            autoComplete="off"
            maxLength={MAX_TYPED}
          />
        </div>
      ))}
    </fieldset>
  );
}
