import { told } from '@/lib/units/show';
import type { CopeAnswer } from '@/lib/workshops/cope-schema';

const WORDS: Record<CopeAnswer['verdict'], string> = {
  meets: 'Meets',
  'falls short': 'Falls short',
  'cannot be judged': 'Cannot be judged',
  prohibited: 'Prohibited',
  unknown: 'Not identified: do not run it',
};

export const verdictWords = ({ verdict }: CopeAnswer) => WORDS[verdict];

/** Whether a station copes with a pair: the sentence, what limits it, what would change it most, what was assumed. */
export function Coped({ answer }: { answer: CopeAnswer }) {
  const { text, why, fixes, limiting, alone, roomPressure, clearing, assumptions, verdict, spills = [] } = answer;
  const bad = verdict !== 'meets' || spills.length > 0;
  return (
    <div className="space-y-3" data-verdict={verdict}>
      <p className={`border-l-4 pl-3 font-semibold ${bad ? 'border-kiln' : 'border-ink'}`}>{text}</p>
      {why.length > 0 && verdict === 'cannot be judged' && (
        <ul className="list-disc pl-5">
          {why.map((each) => (
            <li key={each}>{each}</li>
          ))}
        </ul>
      )}
      {alone !== undefined && roomPressure !== undefined && (
        <p>
          With this exhaust alone {told('airflow', alone, 'si')}; the room is at {told('pressure', roomPressure, 'si')}{' '}
          against outdoors with everything on.
          {clearing !== undefined &&
            ` The room clears to one hundredth in ${Math.round(clearing / 60)} min (mixing factor 3).`}
        </p>
      )}
      {limiting && (
        <p>
          What limits it most: <strong>{limiting}</strong>.
        </p>
      )}
      {verdict === 'falls short' && fixes.length > 0 && (
        <>
          <p className="font-semibold">What would change it most, each solved again:</p>
          <ol className="list-decimal pl-6">
            {fixes.map(({ code, text: what, share }) => (
              <li key={code}>
                {what} Then it has {Math.round(100 * share)} % of what is needed.
              </li>
            ))}
          </ol>
        </>
      )}
      {assumptions.length > 0 && (
        <details>
          <summary>What was assumed (common practice, no source)</summary>
          <ul className="list-disc pl-5">
            {assumptions.map((each) => (
              <li key={each}>{each}</li>
            ))}
          </ul>
        </details>
      )}
      <p className="text-quiet">
        A sum and not a measurement: prove it with smoke and a gauge. Local codes and a licensed practitioner decide.
      </p>
    </div>
  );
}
