import type { SearchAnswer, SearchKind } from '@/lib/search/search';
import { HitItem } from './hit-item';
import { KindLinks } from './kind-links';
import { KIND_WORDS } from './kind-words';
import { NothingFound } from './nothing-found';
import { PairBlock } from './pair-block';

const counted = (answer: SearchAnswer) =>
  answer.total > answer.hits.length ? `The best ${answer.hits.length} of ${answer.total}` : `${answer.total} found`;

function Hits({ answer }: { answer: SearchAnswer }) {
  return (
    <>
      <p className="text-quiet">{counted(answer)}</p>
      <ol className="border-t border-rule">
        {answer.hits.map((hit) => (
          <HitItem key={`${hit.kind}:${hit.slug}`} hit={hit} />
        ))}
      </ol>
    </>
  );
}

/** The answer to a question: the pair when it names one, then the hits, or what to do when there is none. */
export function Results({ answer, kind }: { answer: SearchAnswer; kind?: SearchKind }) {
  const isElsewhere = Object.values(answer.counts).some((count) => count > 0);
  return (
    <>
      {answer.pair && <PairBlock pair={answer.pair} />}
      {isElsewhere && <KindLinks q={answer.query} kind={kind} counts={answer.counts} />}
      {answer.hits.length > 0 && <Hits answer={answer} />}
      {answer.hits.length === 0 && !isElsewhere && <NothingFound q={answer.query} />}
      {answer.hits.length === 0 && isElsewhere && kind && (
        <p>
          None of the matches is among the {KIND_WORDS[kind].many.toLowerCase()}. The other kinds are counted above.
        </p>
      )}
    </>
  );
}
