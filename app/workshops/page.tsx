import type { Metadata } from 'next';
import { Caution } from '@/components/ui/caution';
import { WorkshopBuilder } from '@/components/workshops/builder';
import { libraryOffers } from '@/lib/search/library-offers';

/** Rendered a request: a page stored by the build would lack the nonce of its policy, and its day would stand still. */
export const dynamic = 'force-dynamic';

export const metadata: Metadata = {
  title: 'My workshop',
  description: 'Describe rooms, exhausts and machines once, and see whether they cope with a material and a process.',
};

export default async function WorkshopsPage() {
  const library = await libraryOffers();
  return (
    <>
      <h1>My workshop</h1>
      <p className="mt-2 max-w-measure">
        Rooms, what takes air out, what is let in, what burns, and what is done where. It is kept in this browser only
        and can be left half-done; what is left out is assumed and said.
      </p>
      <noscript>
        <p className="mt-4">
          This page keeps its data in the browser and needs scripts. The worksheets answer without them.
        </p>
      </noscript>
      <WorkshopBuilder library={library} today={new Date().toISOString().slice(0, 10)} />
      <Caution />
    </>
  );
}
