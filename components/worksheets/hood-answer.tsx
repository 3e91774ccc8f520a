import { CaptureFigure } from '@/components/figures/capture-figure';
import { CautionLine } from '@/components/ui/caution';
import { show, told } from '@/lib/units/show';
import { LETTERS } from '@/lib/worksheets/hood-airflow/equations';
import { tableAddressOf, type Typed } from '@/lib/worksheets/hood-airflow/address';
import type { HoodQuestion, HoodResult } from '@/lib/worksheets/hood-airflow/schema';
import type { Answer } from '@/lib/worksheets/worksheet';
import { QuestionPlate } from './question-plate';
import { ReachTable } from './reach-table';
import { StepList } from './step-list';
import { WarningList } from './warning-list';

type Props = { typed: Typed; question: HoodQuestion; answer: Answer<HoodResult> };

const LEFT_OUT =
  'This leaves out draughts, people walking by, the pull of the machine itself, and whether a fan and duct can give this much: that is another sum.';

const NOTE = `Worked in metres and seconds; the constants have no unit, so feet and feet per minute give the same. ${Object.entries(
  LETTERS,
)
  .map(([letter, meaning]) => `${letter}: ${meaning}`)
  .join('. ')}.`;

/** The answer: what to know first, the airflow, the drawing, the numbers and the working. */
export function HoodAnswer({ typed, question, answer: { result, steps, warnings } }: Props) {
  const system = typed.units;
  const airflow = show('airflow', result.airflow, system);
  const canopy = question.hood === 'canopy';
  return (
    <div className="space-y-6">
      <WarningList warnings={warnings} />
      <div className="space-y-1">
        <h3>The hood must draw</h3>
        <p className="figure asked" data-result="airflow">
          {airflow.text}
          <span className="unit">{`\u2009${airflow.unit}`}</span>
        </p>
        <p>
          Mean velocity through the {canopy ? 'open sides' : 'opening'}:{' '}
          <span className="figure">{told('velocity', result.faceVelocity, system)}</span>
        </p>
      </div>
      <CautionLine leavesOut={LEFT_OUT} />
      <QuestionPlate question={question} system={system} />
      <CaptureFigure
        {...{ question, result, system }}
        below={
          <ReachTable
            {...{ contour: result.contour, asked: question.distance ?? 0, system, hood: question.hood }}
            csv={tableAddressOf(typed)}
          />
        }
      />
      <StepList steps={steps} system={system} note={NOTE} />
    </div>
  );
}
