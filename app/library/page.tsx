import type { Metadata } from 'next';
import { LibraryFacets } from '@/components/library/library-facets';
import { LibraryList } from '@/components/library/library-list';
import { Caution } from '@/components/ui/caution';
import { Pager } from '@/components/ui/pager';
import { browse, browseAddress, type BrowseAddress } from '@/lib/search/browse';

type Props = { searchParams: Promise<BrowseAddress> };

export const metadata: Metadata = { title: 'The library' };

export default async function LibraryPage({ searchParams }: Props) {
  const shown = await browse(await searchParams);
  const { page, pages, total, question } = shown;
  return (
    <div className="space-y-6">
      <h1>The library</h1>
      <LibraryFacets shown={shown} />
      <p className="text-quiet">
        {total} {total === 1 ? 'entry' : 'entries'}
      </p>
      <LibraryList entries={shown.entries} />
      <Pager
        label="Pages of the library"
        summary={`Page ${page} of ${pages}`}
        previous={page > 1 ? browseAddress({ ...question, page: page - 1 }) : undefined}
        next={page < pages ? browseAddress({ ...question, page: page + 1 }) : undefined}
      />
      <Caution />
    </div>
  );
}
