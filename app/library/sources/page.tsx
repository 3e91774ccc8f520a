import type { Metadata } from 'next';
import { AllSources } from '@/components/library/all-sources';
import { sourcesInUse } from '@/lib/search/sources-in-use';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'Sources' };

export default async function SourcesPage() {
  return (
    <div className="space-y-6">
      <h1>Sources</h1>
      <p className="max-w-measure">
        Everything the library cites, how it was seen, and which entries rest on it. A source named from memory was not
        read: check it before you rely on it.
      </p>
      <AllSources sources={await sourcesInUse()} />
    </div>
  );
}
