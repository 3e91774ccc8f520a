import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { AskedAnswer } from '@/components/worksheets/asked/answer';
import { asks, isAsked } from '@/components/worksheets/asked/live-results';
import { NoAnswer } from '@/components/worksheets/asked/no-answer';
import { results } from '@/components/worksheets/asked/results';
import { WorksheetView } from '@/components/worksheets/asked/worksheet-view';
import { factsFor } from '@/lib/search/facts-for';
import { askPage, exampleAddress } from '@/lib/worksheets/ask/ask-page';
import { paramsOf } from '@/lib/worksheets/ask/typed';
import { EXAMPLES } from '@/lib/worksheets/examples';
import { worksheetNamed } from '@/lib/worksheets/list';
import { addressFrom } from '@/lib/worksheets/page-address';

type Props = {
  params: Promise<{ name: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
};

const TITLES = { blank: 'Nothing asked yet', refused: 'No answer yet' };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const worksheet = worksheetNamed((await params).name);
  const canonical = `/worksheets/${worksheet?.name}`;
  return worksheet ? { title: worksheet.title, description: worksheet.summary, alternates: { canonical } } : {};
}

export default async function WorksheetPage({ params, searchParams }: Props) {
  const { name } = await params;
  const worksheet = worksheetNamed(name);
  if (!worksheet || !isAsked(name)) notFound();
  const [ask, address] = [asks[name], addressFrom(await searchParams)];
  const asked = askPage(worksheet, ask, address, await factsFor(worksheet));
  const query = paramsOf(asked.typed).toString();
  const shared = { name, query, followsReader: !address.has('units'), date: new Date().toISOString().slice(0, 10) };
  return (
    <>
      <h1>{worksheet.title}</h1>
      <p className="mt-2 mb-6 max-w-measure">{worksheet.summary}</p>
      <p className="no-print mb-6">
        Nothing at hand? <Link href={exampleAddress(ask, EXAMPLES[name]!)}>Load an invented example</Link>
      </p>
      <WorksheetView key={address.toString()} {...shared} faults={asked.state === 'refused' ? asked.faults : []}>
        {asked.state === 'answered' ? (
          <AskedAnswer {...{ ask }} {...asked} Result={results[name]} />
        ) : (
          <NoAnswer typed={asked.typed} title={TITLES[asked.state]}>
            <p>{worksheet.question} Fill in the form; the answer then stands here.</p>
          </NoAnswer>
        )}
      </WorksheetView>
    </>
  );
}
