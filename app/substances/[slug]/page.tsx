import { notFound } from 'next/navigation';
import { SubstanceEntry } from '@/components/entries/substance-entry';
import { entryMetadata, viewEntry } from '@/lib/search/view-entry';

type Props = { params: Promise<{ slug: string }> };

export const dynamic = 'force-static';
export const generateStaticParams = () => [];
export const generateMetadata = async ({ params }: Props) => entryMetadata('substance', (await params).slug);

export default async function SubstancePage({ params }: Props) {
  const view = await viewEntry('substance', (await params).slug);
  if (!view) notFound();
  return <SubstanceEntry view={view} library={view.library} />;
}
