import { Button } from '@/components/ui/button';
import { MAX_QUERY_CHARACTERS } from '@/lib/search/limits';
import type { SearchKind } from '@/lib/search/search';

/** The field on the results page, holding what was asked. A plain GET form: it needs no script. */
export function SearchForm({ q, kind }: { q: string; kind?: SearchKind }) {
  return (
    <form action="/search" role="search" aria-label="Search again" className="max-w-measure space-y-1">
      <label htmlFor="search-again" className="block font-semibold">
        What are you looking for?
      </label>
      <p id="search-again-hint" className="text-base text-quiet">
        A material, a process, a substance, a CAS number, or what you notice.
      </p>
      <div className="flex gap-2">
        <input
          id="search-again"
          aria-describedby="search-again-hint"
          name="q"
          type="search"
          defaultValue={q}
          maxLength={MAX_QUERY_CHARACTERS}
          autoComplete="off"
          className="input min-w-0 flex-1"
        />
        {kind && <input type="hidden" name="kind" value={kind} />}
        <Button type="submit" variant="primary">
          Search
        </Button>
      </div>
    </form>
  );
}
