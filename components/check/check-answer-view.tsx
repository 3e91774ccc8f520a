import Link from 'next/link';
import { OtherMaterials } from '@/components/entries/other-materials';
import { Claims } from '@/components/entries/claims';
import { ReleasedTable } from '@/components/entries/released-table';
import { ControlLine } from '@/components/ui/control-line';
import { Panel } from '@/components/ui/panel';
import { PrintLine } from '@/components/ui/print-line';
import { SourceList } from '@/components/ui/source-list';
import { CopePanel } from '@/components/workshops/cope-panel';
import type { CheckView } from '@/lib/search/ask-check';
import { AnswerCapture } from './answer-capture';
import { AnswerReasons } from './answer-reasons';

function Cautions({ cautions }: { cautions: string[] }) {
  return (
    <section aria-labelledby="check-cautions" className="max-w-measure">
      <h2 id="check-cautions">Cautions</h2>
      <ul className="mt-2 list-disc space-y-1.5 pl-6">
        {cautions.map((text) => (
          <li key={text}>{text}</li>
        ))}
      </ul>
    </section>
  );
}

function RanIt({ view: { process, sources } }: { view: CheckView }) {
  return (
    <section aria-labelledby="ran-it" className="max-w-measure">
      <h2 id="ran-it">I already ran it</h2>
      <p className="mt-2">
        Stop. Leave the exhaust on, leave the room, keep others out. Anyone who feels ill, even hours later, needs a
        doctor today; if breathing is hard, call the local emergency number.{' '}
        <Link href="/guides/after-an-accident" prefetch={false}>
          After an accident, step by step
        </Link>
      </p>
      {process && (
        <Claims id="mishap" title="With this process" claims={process.mishap} sources={sources.map(({ id }) => id)} />
      )}
    </section>
  );
}

/** The answer to a check: the control and its reason first, then what stands behind it. */
export function CheckAnswerView({ view }: { view: CheckView }) {
  const { answer, names, materials } = view;
  return (
    <article className="space-y-8">
      <Panel look="plate">
        <ControlLine control={answer.control} reason={answer.reasons[0]?.text} basis={answer.basis} size="large" />
      </Panel>
      <AnswerReasons answer={answer} sources={view.sources} />
      {answer.releases.length > 0 && (
        <section aria-labelledby="check-released">
          <h2 id="check-released">What comes off, against its limits</h2>
          <ReleasedTable releases={answer.releases} />
        </section>
      )}
      <AnswerCapture view={view} />
      <CopePanel materials={answer.materials} process={answer.process} />
      <Cautions cautions={answer.cautions} />
      {materials.map((it) => (
        <OtherMaterials key={it.title} it={it} names={names} />
      ))}
      <RanIt view={view} />
      <SourceList sources={view.sources} />
      <PrintLine address={view.address} />
    </article>
  );
}
