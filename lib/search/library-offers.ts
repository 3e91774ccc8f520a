import 'server-only';
import type { Kind } from '@/lib/entries/vocabulary';
import { liveLibrary } from './live-library';

/** The processes and materials that are published, by title, for the lists of a form. */
export async function libraryOffers() {
  const { library } = await liveLibrary();
  const of = (kind: Kind) =>
    library.entries
      .filter((entry) => entry.kind === kind)
      .map(({ slug, title }) => ({ value: slug, label: title }))
      .sort((a, b) => a.label.localeCompare(b.label));
  return { processes: of('process'), materials: of('material') };
}
