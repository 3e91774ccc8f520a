import { CautionLine } from '@/components/ui/caution';
import { Notice } from '@/components/ui/notice';
import type { System } from '@/lib/units/kinds';
import type { Ask } from '@/lib/worksheets/ask/fields';
import { isExample } from '@/lib/worksheets/ask/is-example';
import { paramsOf, type Typed } from '@/lib/worksheets/ask/typed';
import type { Answer } from '@/lib/worksheets/worksheet';
import { StepList } from '../step-list';
import { WarningList } from '../warning-list';
import { AskedPlate } from './question-plate';

/** What a worksheet shows of its own result. The numbers are SI; `system` is how the reader wants them. */
export type ResultProps<R = never> = { result: R; question: object; system: System };
type Props = {
  ask: Ask;
  typed: Typed;
  question: object;
  answer: Answer<unknown>;
  Result: React.ComponentType<ResultProps<never>>;
};

const LEFT_OUT =
  'This leaves out what it was not told: wind, doors, dirt, wear, and the machine as it is built. Measure before you rely on it.';

/** The answer: what to know first, the result, the caution, the working. */
export function AskedAnswer({ ask, typed, question, answer: { result, steps, warnings }, Result }: Props) {
  const system = typed.units;
  return (
    <div className="space-y-6">
      {isExample(ask, typed) && <Notice>Invented example: no such workshop was measured.</Notice>}
      <WarningList warnings={warnings} />
      <Result result={result as never} question={question} system={system} />
      <CautionLine leavesOut={LEFT_OUT} />
      <AskedPlate ask={ask} typed={typed} />
      <p className="no-print">
        <a href={`/api/worksheets/${ask.name}/table.csv?${paramsOf(typed)}`} download>
          Take the table with you (CSV)
        </a>
      </p>
      <StepList steps={steps} system={system} note="Worked in SI units: metres, seconds, pascals." />
    </div>
  );
}
