import type { ControlAnswer } from '@/lib/entries/vocabulary';

/** The word shown for each rung; unknown is spelled out, because it is the one that is misread. */
export const CONTROL_WORDS: Record<ControlAnswer, string> = {
  'general ventilation': 'General ventilation',
  'local exhaust': 'Local exhaust',
  'enclosed exhaust': 'Enclosed exhaust',
  prohibited: 'Prohibited',
  unknown: 'Not identified: do not run it',
};
