import type { Metadata } from 'next';
import Link from 'next/link';
import { WrongAddress } from '@/components/layout/wrong-address';
import { Button } from '@/components/ui/button';

export const metadata: Metadata = { title: 'Nothing at this address' };

export default function NotFound() {
  return (
    <div className="max-w-measure space-y-6">
      <h1>Nothing at this address</h1>
      <p>
        No page of Fumelore is kept here: the address may be mistyped, or the entry withdrawn. That nothing is written
        here says nothing about what a material gives off.
      </p>
      <WrongAddress />
      <form
        action="/search"
        role="search"
        aria-label="What you were looking for"
        className="flex flex-wrap items-end gap-2"
      >
        <div className="min-w-0 flex-1 basis-60 space-y-1">
          <label htmlFor="lost-search" className="block font-semibold">
            Search for it by name
          </label>
          <input id="lost-search" name="q" type="search" maxLength={200} className="input" />
        </div>
        <Button type="submit" variant="primary">
          Search
        </Button>
      </form>
      <p>
        Or look through{' '}
        <Link href="/library" prefetch={false}>
          everything published
        </Link>
        .
      </p>
    </div>
  );
}
