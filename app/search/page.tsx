import type { Metadata } from 'next';
import { Results } from '@/components/search/results';
import { SearchForm } from '@/components/search/search-form';
import { Caution } from '@/components/ui/caution';
import { findInLibrary } from '@/lib/search/find-in-library';
import { readSearchAddress } from '@/lib/search/search-address';

type Props = { searchParams: Promise<{ q?: string | string[]; kind?: string | string[] }> };

export async function generateMetadata({ searchParams }: Props): Promise<Metadata> {
  const { q } = readSearchAddress(await searchParams);
  return { title: q ? `“${q}” in the library` : 'Search', robots: { index: false } };
}

export default async function SearchPage({ searchParams }: Props) {
  const { q, kind } = readSearchAddress(await searchParams);
  return (
    <div className="space-y-6">
      <h1>{q ? `Search: ${q}` : 'Search the library'}</h1>
      <SearchForm q={q} kind={kind} />
      {q && <Results answer={await findInLibrary({ q, kind })} kind={kind} />}
      <Caution />
    </div>
  );
}
