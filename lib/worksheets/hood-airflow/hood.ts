import type { Face } from '@/lib/air/face';
import type { Hood } from '@/lib/air/hood-airflow';
import { metres, squareMetres } from '@/lib/units/quantity';
import type { HoodQuestion } from './schema';

function faceOf({ diameter, width, height }: HoodQuestion): Face {
  return diameter !== undefined
    ? { diameter: metres(diameter) }
    : { width: metres(width ?? NaN), height: metres(height ?? NaN) };
}

/**
 * The hood of an admitted question, with its sizes in m and m2.
 * @throws RangeError from the formulas when the question was never admitted by the schema and lacks a size
 */
export function hoodOf(question: HoodQuestion): Hood {
  const { hood } = question;
  if (hood === 'enclosure') return { hood, openArea: squareMetres(question.openArea ?? NaN) };
  if (hood === 'canopy') return { hood, perimeter: metres(question.perimeter ?? NaN) };
  const { width, height } = question;
  if (hood === 'plain-slot' || hood === 'flanged-slot')
    return { hood, face: { width: metres(width ?? NaN), height: metres(height ?? NaN) } };
  return { hood, face: faceOf(question) };
}
