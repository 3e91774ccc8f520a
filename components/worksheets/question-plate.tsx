import { told } from '@/lib/units/show';
import type { System } from '@/lib/units/kinds';
import { kindOf, NUMBERS } from '@/lib/worksheets/hood-airflow/fields';
import { fieldWords, HOOD_WORDS, WORK_WORDS } from '@/lib/worksheets/hood-airflow/names';
import type { HoodQuestion } from '@/lib/worksheets/hood-airflow/schema';

/** What was asked, so that an answer on paper still says of what. */
export function QuestionPlate({ question, system }: { question: HoodQuestion; system: System }) {
  const numbers = NUMBERS.filter((field) => question[field] !== undefined);
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-5 gap-y-0.5">
      <dt className="label">Hood</dt>
      <dd>{HOOD_WORDS[question.hood].name}</dd>
      {numbers.map((field) => (
        <div key={field} className="contents">
          <dt className="label">{fieldWords(field)}</dt>
          <dd className="figure">{told(kindOf(field), question[field]!, system)}</dd>
        </div>
      ))}
      {question.work && question.work.length > 0 && (
        <>
          <dt className="label">The work</dt>
          <dd>{question.work.map((work) => WORK_WORDS[work]).join('; ')}</dd>
        </>
      )}
    </dl>
  );
}
