import 'server-only';
import { factsOf } from '@/lib/entries/worksheet-facts';
import { NO_FACTS, type LibraryFacts } from '@/lib/worksheets/facts';
import type { Worksheet } from '@/lib/worksheets/worksheet';
import { liveLibrary } from './live-library';

/** What a worksheet may know of the library: nothing is loaded for one that asks nothing of it. */
export const factsFor = async ({ asksLibrary }: Worksheet): Promise<LibraryFacts> =>
  asksLibrary ? factsOf((await liveLibrary()).library) : NO_FACTS;
