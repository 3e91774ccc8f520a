import type { Metadata } from 'next';
import { CheckAnswerView } from '@/components/check/check-answer-view';
import { CheckForm } from '@/components/check/check-form';
import { Caution } from '@/components/ui/caution';
import { askCheck, type CheckAddress } from '@/lib/search/ask-check';

type Props = { searchParams: Promise<CheckAddress> };

export async function generateMetadata({ searchParams }: Props): Promise<Metadata> {
  const { title } = await askCheck(await searchParams);
  return { title, robots: { index: false } };
}

export default async function CheckPage({ searchParams }: Props) {
  const asked = await askCheck(await searchParams);
  return (
    <div className="space-y-8">
      <h1>{asked.title}</h1>
      {asked.view && <CheckAnswerView view={asked.view} />}
      <section aria-labelledby="ask" className="no-print">
        <h2 id="ask" className="mb-3">
          {asked.view ? 'Ask another' : 'Choose what it is and what you will do'}
        </h2>
        <CheckForm materials={asked.materials} process={asked.process} errors={asked.errors} />
      </section>
      <Caution />
    </div>
  );
}
