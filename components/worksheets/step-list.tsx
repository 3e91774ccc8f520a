import type { Kind, System } from '@/lib/units/kinds';
import { figure, told } from '@/lib/units/show';
import type { Step } from '@/lib/worksheets/worksheet';

const KINDS: Record<string, Kind> = {
  ...{ 'm/s': 'velocity', 'm3/s': 'airflow', m: 'length', m2: 'area', Pa: 'pressure' },
};

const valueOf = ({ value, unit }: Step, system: System) => {
  const kind = KINDS[unit];
  return kind ? told(kind, value, system) : `${figure(value)} ${unit}`.trim();
};

function OneStep({ step, system }: { step: Step; system: System }) {
  return (
    <li className="space-y-0.5">
      <p>
        {step.label}: <strong className="figure">{valueOf(step, system)}</strong>
      </p>
      <p>
        <code>{step.equation}</code>
      </p>
      <p className="text-base text-quiet">{step.source}</p>
    </li>
  );
}

/** The working, line by line, behind one click; on paper it stands open. */
export function StepList({ steps, system, note }: { steps: readonly Step[]; system: System; note?: string }) {
  return (
    <details>
      <summary className="font-semibold">The working, with the source of each equation</summary>
      <ol className="mt-3 list-decimal space-y-3 pl-6">
        {steps.map((step, i) => (
          <OneStep key={`${i} ${step.label}`} step={step} system={system} />
        ))}
      </ol>
      {note && <p className="mt-3 text-base text-quiet">{note}</p>}
    </details>
  );
}
