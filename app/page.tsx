import Link from 'next/link';
import { CheckForm } from '@/components/check/check-form';
import { Caution } from '@/components/ui/caution';
import { Panel } from '@/components/ui/panel';

export const dynamic = 'force-static';

const FIRST = [
  ['/guides/identifying-plastics', 'I do not know what this sheet is'],
  ['/guides/after-an-accident', 'Something went wrong: what now?'],
  ['/worksheets/hood-airflow', 'How much air does my hood need?'],
  ['/guides/make-up-air-and-flues', 'Where does the air come from, and will I pull flue gas?'],
  ['/guides/capture-versus-dilution', 'Is an open window enough?'],
  ['/library', 'Browse the whole library'],
] as const;

export default function FrontPage() {
  return (
    <div className="space-y-8">
      <header className="max-w-measure space-y-3">
        <h1>Before you switch it on</h1>
        <p className="font-reading text-xl leading-relaxed">
          What this material gives off when it is cut, printed, soldered, cast or sprayed, what must hold it, and
          whether your hood has the air for it. Every figure shows where it comes from.
        </p>
      </header>
      <Panel title="Check a material and a process">
        <CheckForm materials={[]} process="" />
      </Panel>
      <nav aria-label="Where to begin">
        <h2>Where to begin</h2>
        <ul className="mt-3 grid gap-x-8 gap-y-2 sm:grid-cols-2">
          {FIRST.map(([href, words]) => (
            <li key={href}>
              <Link href={href} prefetch={false}>
                {words}
              </Link>
            </li>
          ))}
        </ul>
      </nav>
      <Caution />
    </div>
  );
}
