import type { LimitFact } from './facts';

/** A limit in words, and that it is to be checked where nobody printed it. */
export const limitWords = ({ authority, basis, value, unit, provenance }: LimitFact) =>
  `${authority} ${basis} ${value} ${unit}${provenance === 'published' ? '' : ` (${provenance}: check it)`}`;
