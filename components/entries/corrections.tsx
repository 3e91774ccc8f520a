import type { FrontMatter } from '@/lib/entries/schema';
import { Citations } from './citations';

/** What is often said of it and does not hold, with what does. */
export function Corrections({ frontMatter }: { frontMatter: FrontMatter }) {
  const corrections = frontMatter.corrections ?? [];
  if (corrections.length === 0) return null;
  return (
    <section aria-labelledby="often-said" className="mt-8 max-w-measure">
      <h2 id="often-said">Often said, and wrong</h2>
      <dl className="mt-2 space-y-3">
        {corrections.map((each) => (
          <div key={each.claim} className="border-l-2 border-rule pl-4">
            <dt>
              <q>{each.claim}</q>
            </dt>
            <dd className="mt-1">
              {each.truth}
              <Citations ids={each.sources} sources={frontMatter.sources} provenance={each.provenance} />
            </dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
