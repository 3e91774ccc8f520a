import { airflowOf, type HoodName } from '@/lib/air/hood-airflow';
import { metres, metresPerSecond } from '@/lib/units/quantity';
import { addressOf, typedOf } from './address';
import { EQUATIONS } from './equations';
import { FIELDS_OF, NUMBERS, type NumberField } from './fields';
import { hoodOf } from './hood';
import { hoodAirflowRequest, type HoodQuestion } from './schema';

type Stated = { value?: number; min?: number; max?: number };

/** The capture block of an entry, as far as it is reckoned with: each number stated as a value or a range, SI. */
export type CaptureNumbers = { hood: HoodName } & Partial<Record<NumberField, Stated>>;

type End = 'min' | 'max';
const at = (end: End, stated?: Stated) => stated?.[end] ?? stated?.value ?? stated?.[end === 'min' ? 'max' : 'min'];

/** The question at one end of every range: the least air at `min`, the most at `max`. */
function questionAt(end: End, capture: CaptureNumbers): Partial<HoodQuestion> & { hood: HoodName } {
  const round = capture.diameter !== undefined;
  const used = FIELDS_OF[capture.hood].filter((field) => !(round && (field === 'width' || field === 'height')));
  const numbers = NUMBERS.filter((field) => used.includes(field)).map((field) => [field, at(end, capture[field])]);
  return { hood: capture.hood, ...Object.fromEntries(numbers.filter(([, value]) => value !== undefined)) };
}

/**
 * The hood worksheet filled in with an entry's capture block, at the end of its ranges that needs the most air. Names no units: the
 * worksheet shows its numbers in those the reader chose.
 */
export const hoodWorksheetUrl = (capture: CaptureNumbers) => addressOf(typedOf(questionAt('max', capture)), false);

/**
 * The airflow an entry's capture block comes to, in m3/s, with the equation it is reckoned by; null when the block lacks a number or
 * states one the worksheet refuses.
 */
export function airflowOfCapture(capture: CaptureNumbers): { min: number; max: number; equation: string } | null {
  const [min, max] = (['min', 'max'] as const).map((end) => {
    const admitted = hoodAirflowRequest.safeParse(questionAt(end, capture));
    if (!admitted.success) return null;
    const { velocity, distance = 0 } = admitted.data;
    return airflowOf(hoodOf(admitted.data), metresPerSecond(velocity), metres(distance));
  });
  return min == null || max == null ? null : { min, max, equation: EQUATIONS[capture.hood].airflow };
}
