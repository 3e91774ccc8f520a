import type { Metadata } from 'next';
import Link from 'next/link';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { HoodAnswer } from '@/components/worksheets/hood-answer';
import { HoodWorksheet } from '@/components/worksheets/hood-worksheet';
import { hoodAirflow } from '@/lib/worksheets/hood-airflow/about';
import { addressOf, HOOD_ADDRESS, typedOf } from '@/lib/worksheets/hood-airflow/address';
import { askHood } from '@/lib/worksheets/hood-airflow/ask';
import { EXAMPLE, isExample } from '@/lib/worksheets/hood-airflow/example';
import { addressFrom } from '@/lib/worksheets/page-address';

export const metadata: Metadata = {
  title: hoodAirflow.title,
  description: hoodAirflow.summary,
  alternates: { canonical: HOOD_ADDRESS },
};

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

const TITLES = { blank: 'Nothing asked yet', refused: 'No answer yet' };

export default async function HoodAirflowPage({ searchParams }: Props) {
  const address = addressFrom(await searchParams);
  const asked = askHood(address);
  const faults = asked.state === 'refused' ? asked.faults : [];
  return (
    <>
      <h1>{hoodAirflow.title}</h1>
      <p className="mt-2 mb-6 max-w-measure">{hoodAirflow.summary}</p>
      <p className="no-print mb-6">
        No hood at hand? <Link href={addressOf(typedOf(EXAMPLE), false)}>Load an invented example</Link>
      </p>
      <HoodWorksheet
        key={address.toString()}
        typed={asked.typed}
        faults={faults}
        followsReader={!address.has('units')}
        date={new Date().toISOString().slice(0, 10)}
      >
        {asked.state === 'answered' ? (
          <>
            {isExample(asked.question) && <Notice>Invented example: no such bench was measured.</Notice>}
            <HoodAnswer typed={asked.typed} question={asked.question} answer={asked.answer} />
          </>
        ) : (
          <EmptyState title={TITLES[asked.state]}>
            <p>Choose the hood, give its size, its distance and the velocity you want; the airflow then stands here.</p>
          </EmptyState>
        )}
      </HoodWorksheet>
    </>
  );
}
