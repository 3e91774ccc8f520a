import { notFound } from 'next/navigation';
import { MaterialEntry } from '@/components/entries/material-entry';
import { entryMetadata, viewEntry } from '@/lib/search/view-entry';

type Props = { params: Promise<{ slug: string }> };

export const dynamic = 'force-static';
export const generateStaticParams = () => [];
export const generateMetadata = async ({ params }: Props) => entryMetadata('material', (await params).slug);

export default async function MaterialPage({ params }: Props) {
  const view = await viewEntry('material', (await params).slug);
  if (!view) notFound();
  return <MaterialEntry view={view} library={view.library} />;
}
