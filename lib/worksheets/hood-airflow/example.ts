import type { HoodQuestion } from './schema';

/** A question to look at before one's own. The bench is invented; the velocity is the published class for quiet release. */
export const EXAMPLE: HoodQuestion = { hood: 'flanged-opening', velocity: 0.51, distance: 0.25, diameter: 0.2 };

/** True for the example as it stands, to the last number. */
export const isExample = (question: HoodQuestion) =>
  Object.keys({ ...EXAMPLE, ...question }).every((key) => {
    const field = key as keyof HoodQuestion;
    return EXAMPLE[field] === question[field];
  });
