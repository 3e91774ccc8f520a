import { factsOf } from '@/lib/entries/worksheet-facts';
import { contentLibrary } from '../search/content-library';

/** What the starter library, read from its files, tells a worksheet. */
export const libraryFacts = factsOf(contentLibrary());
