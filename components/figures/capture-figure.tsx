import type { ReactNode } from 'react';
import type { System } from '@/lib/units/kinds';
import { told } from '@/lib/units/show';
import { HOOD_WORDS } from '@/lib/worksheets/hood-airflow/names';
import type { HoodQuestion, HoodResult } from '@/lib/worksheets/hood-airflow/schema';
import { CanopyDrawing } from './canopy-drawing';
import { EnclosureDrawing } from './enclosure-drawing';
import { FigureFrame } from './figure-frame';
import { OpeningDrawing } from './opening-drawing';

export type CaptureProps = { question: HoodQuestion; result: HoodResult; system: System };

/** The result in one or two sentences, as the drawing shows it. */
function textOf({ question, result, system }: CaptureProps): string {
  const draws = `draws ${told('airflow', result.airflow, system)}`;
  const name = HOOD_WORDS[question.hood].name.toLowerCase();
  const speed = told('velocity', question.velocity, system);
  if (question.hood === 'enclosure') return `An ${name} that ${draws} takes air in by its gaps at ${speed}.`;
  const away = told('length', question.distance ?? 0, system);
  if (question.hood === 'canopy') return `A canopy ${away} above the work that ${draws} keeps a curtain of ${speed}.`;
  const far = result.contour.at(-1)!;
  const falls = `${told('length', far.distance, system)} away it is ${told('velocity', far.velocity, system)}`;
  return `The hood (${name}) ${draws}. At the source, ${away} away, the air moves at ${speed}; ${falls}.`;
}

/** The hood, the source and how the pull falls off, drawn to scale from the numbers of the answer. */
export function CaptureFigure({ below, ...props }: CaptureProps & { below?: ReactNode }) {
  const { hood } = props.question;
  const isOpening = hood !== 'enclosure' && hood !== 'canopy';
  return (
    <FigureFrame
      title={isOpening ? 'Hood, source and lines of equal velocity' : HOOD_WORDS[hood].name}
      text={textOf(props)}
      note={
        isOpening
          ? 'Drawn to scale from the side. The lines cross the axis where the equation puts them; beside it their shape is a sketch.'
          : 'Not to scale.'
      }
      below={below}
    >
      {hood === 'enclosure' && <EnclosureDrawing {...props} />}
      {hood === 'canopy' && <CanopyDrawing {...props} />}
      {isOpening && <OpeningDrawing {...props} />}
    </FigureFrame>
  );
}
