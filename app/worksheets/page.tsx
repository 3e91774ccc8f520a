import type { Metadata } from 'next';
import Link from 'next/link';
import { Caution } from '@/components/ui/caution';
import { WORKSHEETS } from '@/lib/worksheets/list';

export const metadata: Metadata = {
  title: 'Worksheets',
  description: 'The arithmetic of air for a small workshop, each sum with its working and its sources.',
};

export default function WorksheetsPage() {
  return (
    <>
      <h1>Worksheets</h1>
      <p className="mt-2 max-w-measure">
        Each answers one question, shows its working, and says where it ends. The question stands in the address, so it
        can be kept or passed on.
      </p>
      <p className="mt-3">
        <Link href="/workshops">Describe a workshop of your own</Link>, and each check is held against it.
      </p>
      <ul className="mt-6 max-w-measure space-y-5">
        {WORKSHEETS.map(({ name, title, question, summary }) => (
          <li key={name} className="panel">
            <p className="text-quiet">“{question}”</p>
            <h2 className="mt-1">
              <Link href={`/worksheets/${name}`}>{title}</Link>
            </h2>
            <p className="mt-1">{summary}</p>
          </li>
        ))}
      </ul>
      <Caution />
    </>
  );
}
