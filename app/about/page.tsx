import type { Metadata } from 'next';
import { DemoWorkshops } from '@/components/workshops/demo-workshops';
import { Caution } from '@/components/ui/caution';
import { inventedWorkshops } from '@/lib/workshops/invented-workshops';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'About' };

export default async function AboutPage() {
  return (
    <div className="max-w-measure space-y-6">
      <h1>About this library</h1>
      <p>
        It tells what materials give off when they are worked, what control each pair of material and process needs, and
        how much air that takes. It never says that something may be done without harm.
      </p>
      <p>
        Every value names where it comes from: a published source, common practice without one, or memory. A value from
        memory is a pointer to be checked, not a fact to build on. A pair that nobody has reviewed is inferred from
        composition and marked so, or not answered at all.
      </p>
      <DemoWorkshops workshops={await inventedWorkshops()} />
      <Caution />
    </div>
  );
}
