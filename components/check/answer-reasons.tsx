import Link from 'next/link';
import { SourceNumber } from '@/components/ui/source-number';
import type { CheckAnswer } from '@/lib/check/check';
import type { Source } from '@/lib/entries/schema';

const BASES = {
  reviewed: 'Each of these pairs has been reviewed.',
  inferred:
    'At least one of these is inferred from composition and has not been reviewed. An inference never permits more than local exhaust.',
  none: 'Nothing reviewed covers this. Not identified means do not run it.',
};

/** Why the control is what it is: one reason a material, the strictest first, each with its sources. */
export function AnswerReasons({ answer, sources }: { answer: CheckAnswer; sources: Source[] }) {
  const numberOf = (id: string) => sources.findIndex((source) => source.id === id) + 1;
  return (
    <section aria-labelledby="why" className="max-w-measure">
      <h2 id="why">Why</h2>
      <ul className="mt-2 list-disc space-y-1.5 pl-6">
        {answer.reasons.map(({ text, sources: ids }) => (
          <li key={text}>
            {text}
            {ids.map((id) => (numberOf(id) > 0 ? <SourceNumber key={id} n={numberOf(id)} /> : null))}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-quiet">{BASES[answer.basis]}</p>
      {answer.entries.length > 0 && (
        <p className="mt-2">
          Entries behind it:{' '}
          {answer.entries.map(({ kind, slug, revision, url }, i) => (
            <span key={url}>
              {i > 0 && ', '}
              <Link href={url} prefetch={false}>
                {kind} {slug.replaceAll('-', ' ')}
              </Link>{' '}
              (revision {revision})
            </span>
          ))}
        </p>
      )}
      {answer.basis === 'none' && (
        <p className="mt-2">
          <Link href="/guides/identifying-plastics" prefetch={false}>
            How to identify an unknown plastic, and the limits of each test
          </Link>
        </p>
      )}
    </section>
  );
}
