import { notFound } from 'next/navigation';
import { ProcessEntry } from '@/components/entries/process-entry';
import { entryMetadata, viewEntry } from '@/lib/search/view-entry';

type Props = { params: Promise<{ slug: string }> };

export const dynamic = 'force-static';
export const generateStaticParams = () => [];
export const generateMetadata = async ({ params }: Props) => entryMetadata('process', (await params).slug);

export default async function ProcessPage({ params }: Props) {
  const view = await viewEntry('process', (await params).slug);
  if (!view) notFound();
  return <ProcessEntry view={view} library={view.library} />;
}
