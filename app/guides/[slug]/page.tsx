import { notFound } from 'next/navigation';
import { GuideEntry } from '@/components/entries/guide-entry';
import { entryMetadata, viewEntry } from '@/lib/search/view-entry';

type Props = { params: Promise<{ slug: string }> };

export const dynamic = 'force-static';
export const generateStaticParams = () => [];
export const generateMetadata = async ({ params }: Props) => entryMetadata('guide', (await params).slug);

export default async function GuidePage({ params }: Props) {
  const view = await viewEntry('guide', (await params).slug);
  if (!view) notFound();
  return <GuideEntry view={view} library={view.library} />;
}
