import { SubmitButton } from '@/components/forms/submit-button';
import { MaterialFields } from './material-fields';
import { NameField } from './name-field';

type Props = { materials: string[]; process: string; errors?: { material?: string; process?: string } };

/** Asks for the materials and the process by name. A plain form: the answer is the address it leads to. */
export function CheckForm({ materials, process, errors = {} }: Props) {
  return (
    <form action="/check" className="grid gap-4 sm:grid-cols-[1fr_1fr_auto] sm:items-start">
      <MaterialFields materials={materials} error={errors.material} />
      <NameField
        name="process"
        label="What will you do with it?"
        hint="Laser cutting, printing, sanding, soldering …"
        value={process}
        kind="process"
        error={errors.process}
      />
      <div className="sm:pt-14">
        <SubmitButton variant="primary">Check</SubmitButton>
      </div>
    </form>
  );
}
