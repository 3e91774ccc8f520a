import { ControlLine } from '@/components/ui/control-line';
import { CIRCUMSTANCES } from '@/lib/worksheets/circumstances';
import type { Warning } from '@/lib/worksheets/worksheet';

/** The codes that say the number itself is not the answer. */
const DECISIVE: readonly string[] = [
  ...[
    'unidentified',
    'sprayed-isocyanates',
    'below-draught',
    'flue-spills',
    'comes-back',
    'halogen',
    'over',
    'over-limit',
  ],
  ...CIRCUMSTANCES,
];

/** All that must be known before the number: what decides against it first, ruled off heavily. */
export function WarningList({ warnings }: { warnings: readonly Warning[] }) {
  if (warnings.length === 0) return null;
  const unknown = warnings.some(({ code }) => code === 'unidentified');
  return (
    <section aria-labelledby="mind" className="space-y-3">
      <h3 id="mind">Before the number</h3>
      {unknown && <ControlLine control="unknown" size="medium" />}
      <ul className="space-y-2">
        {warnings.map(({ code, text }) => (
          <li
            key={`${code} ${text}`}
            data-code={code}
            className={`border-l-4 pl-3 ${DECISIVE.includes(code) ? 'border-kiln font-semibold' : 'border-quiet'}`}
          >
            {text}
          </li>
        ))}
      </ul>
    </section>
  );
}
