import type { Library, PublishedEntry } from '@/lib/entries/library';
import { urlOf } from '@/lib/entries/library';
import type { Capture, Material, Process } from '@/lib/entries/schema';
import { airflowOfCapture } from '@/lib/worksheets/hood-airflow/from-capture';
import type { CheckAnswer, CheckCapture } from './check';
import { releasesOf } from './releases-of';
import { basisOf, strictestFirst, type Verdict, verdictOf } from './rules';
import { citedSources } from './sources-of';

const USUAL = [
  'This says nothing about your machine, your room or how the work is done: it is one part of a risk assessment.',
  'Local codes and a licensed practitioner decide; an exposure limit is for healthy adults at work, not for homes or schools.',
  'If anyone feels ill or an alarm sounds: stop, leave, keep others out, and call the local emergency number.',
];

function captureOf(capture: Capture | undefined): CheckCapture | null {
  const reckoned = capture && airflowOfCapture(capture);
  if (!capture || !reckoned) return null;
  const { equation, ...airflow } = reckoned;
  const { min, max } = capture.velocity;
  const { distance } = capture;
  return {
    ...{ velocity: { min: min!, max: max! }, hood: capture.hood },
    ...{ distance: distance?.value ?? distance?.max ?? null, airflow, equation },
  };
}

const entry = <T extends 'material' | 'process'>(library: Library, kind: T, slug: string) =>
  library.byKey.get(`${kind}:${slug}`) as
    (PublishedEntry & { frontMatter: T extends 'material' ? Material : Process }) | undefined;

function cautionsOf(verdicts: Verdict[], process: Process | undefined): string[] {
  const fire = verdicts.flatMap(({ pair }) => (pair?.fire ? [`Fire: ${pair.fire}`] : []));
  return [...new Set([...fire, ...(process?.cautions.map(({ text }) => text) ?? []), ...USUAL])];
}

/**
 * Answers a check from a published library. Pure. Of several materials (a laminate, a coated stock) the strictest control wins and
 * every reason is kept, the strictest first. A material or process that is not in the library makes the answer `unknown`, unless
 * another of the materials is prohibited outright.
 */
export function answerCheck(library: Library, materialSlugs: string[], processSlug: string): CheckAnswer {
  const process = entry(library, 'process', processSlug);
  const materials = materialSlugs.map((slug) => ({ slug, found: entry(library, 'material', slug) }));
  const verdicts = strictestFirst(
    materials.map(({ slug, found }) => verdictOf(slug, found?.frontMatter, process?.frontMatter, processSlug)),
  );
  const { control } = verdicts[0]!;
  const runnable = control !== 'prohibited' && control !== 'unknown';
  const releases = releasesOf(library, verdicts);
  const used = [...materials.flatMap(({ found }) => (found ? [found] : [])), ...(process ? [process] : [])];
  const reasons = verdicts.map(({ reason }) => reason);
  return {
    ...{ materials: materialSlugs, process: processSlug, control },
    basis: control === 'prohibited' ? verdicts[0]!.basis : basisOf(verdicts),
    ...{ reasons, releases },
    capture: runnable ? captureOf(verdicts[0]!.pair?.capture ?? process?.frontMatter.capture) : null,
    cautions: cautionsOf(verdicts, process?.frontMatter),
    sources: citedSources(library, reasons, releases, process?.frontMatter),
    entries: used.map(({ kind, slug, revision }) => ({ kind, slug, revision, url: urlOf(kind, slug) })),
  };
}
