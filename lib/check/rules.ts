import type { Material, Pair, Process } from '@/lib/entries/schema';
import type { ControlAnswer } from '@/lib/entries/vocabulary';
import type { CheckBasis, Reason } from './check';
import { inferControl } from './infer-control';

export type Verdict = { control: ControlAnswer; basis: CheckBasis; reason: Reason; pair?: Pair };

/** From loosest to tightest. Unknown stands just below prohibited: it is treated as prohibited, but a known ban is said as one. */
const LADDER: ControlAnswer[] = ['general ventilation', 'local exhaust', 'enclosed exhaust', 'unknown', 'prohibited'];

export const NOT_IDENTIFIED = 'Treat it as prohibited until it is identified: do not run it.';

const unknown = (what: string): Verdict => ({
  control: 'unknown',
  basis: 'none',
  reason: { text: `${what} ${NOT_IDENTIFIED}`, sources: [] },
});

/** One material under one process: a reviewed pair first, composition second, and otherwise unknown. */
export function verdictOf(
  slug: string,
  material: Material | undefined,
  process: Process | undefined,
  processSlug: string,
): Verdict {
  if (!material) return unknown(`The library holds no material “${slug}”.`);
  if (!process) return unknown(`The library holds no process “${processSlug}”.`);
  const pair = material.pairs.find((each) => each.process === processSlug);
  if (pair)
    return {
      control: pair.control,
      basis: 'reviewed',
      reason: { text: `${material.title}: ${pair.reason}`, sources: pair.sources },
      pair,
    };
  const inference = inferControl(material, process);
  if (!inference)
    return unknown(
      `${material.title} with ${process.title.toLowerCase()} has not been reviewed, and its composition alone does not tell.`,
    );
  const text = `${material.title}: ${inference.text} Inferred from composition; nobody has reviewed this pair.`;
  return {
    control: inference.control,
    basis: 'inferred',
    reason: { text, sources: material.composition.source ? [material.composition.source] : [] },
  };
}

/** The place of a control on the ladder; a higher one is tighter. */
export const rungOf = (control: ControlAnswer) => LADDER.indexOf(control);

/** Of several verdicts the tightest, first among its equals; and all of them in order of tightness. */
export function strictestFirst(verdicts: Verdict[]): Verdict[] {
  return [...verdicts].sort((a, b) => rungOf(b.control) - rungOf(a.control));
}

/** `reviewed` only when every verdict is; `none` when any has no ground at all; otherwise `inferred`. */
export function basisOf(verdicts: Verdict[]): CheckBasis {
  if (verdicts.some(({ basis }) => basis === 'none')) return 'none';
  return verdicts.every(({ basis }) => basis === 'reviewed') ? 'reviewed' : 'inferred';
}
