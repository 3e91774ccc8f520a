import 'server-only';
import type { PublishedEntry } from '@/lib/entries/library';
import { strictestOf } from '@/lib/entries/pairs-of';
import { CONTROLS, type Control, FAMILIES, type Kind, KINDS } from '@/lib/entries/vocabulary';
import { liveLibrary } from './live-library';

/** Entries shown on one page of the library. */
export const PER_PAGE = 30;

type Family = (typeof FAMILIES)[number];
export type BrowseAddress = Record<string, string | string[] | undefined>;
export type BrowseQuestion = { kind?: Kind; family?: Family; control?: Control; page: number };
export type ListedEntry = { entry: PublishedEntry; control?: Control; family?: Family };
export type Facet = { name: 'kind' | 'family' | 'control'; value: string; count: number };
export type Browsed = {
  question: BrowseQuestion;
  entries: ListedEntry[];
  facets: Facet[];
  page: number;
  pages: number;
  total: number;
};

const among = <T extends string>(allowed: readonly T[], value: string | string[] | undefined): T | undefined =>
  allowed.find((each) => each === value);

function readAddress(address: BrowseAddress): BrowseQuestion {
  const kind = among(KINDS, address.kind);
  const material = kind === 'material';
  const page = typeof address.page === 'string' && /^\d{1,4}$/.test(address.page) ? Number(address.page) : 1;
  return {
    kind,
    family: material ? among(FAMILIES, address.family) : undefined,
    control: material ? among(CONTROLS, address.control) : undefined,
    page,
  };
}

/** The address of a page of the library under a question. */
export function browseAddress({ kind, family, control, page }: BrowseQuestion): string {
  const query = new URLSearchParams();
  if (kind) query.set('kind', kind);
  if (family) query.set('family', family);
  if (control) query.set('control', control);
  if (page > 1) query.set('page', String(page));
  return query.size > 0 ? `/library?${query}` : '/library';
}

const listed = (entry: PublishedEntry): ListedEntry =>
  entry.frontMatter.kind === 'material'
    ? { entry, family: entry.frontMatter.family, control: strictestOf(entry.frontMatter) }
    : { entry };

function count(name: Facet['name'], values: readonly string[], of: (value: string) => number): Facet[] {
  return values.map((value) => ({ name, value, count: of(value) })).filter((facet) => facet.count > 0);
}

function facetsOf(all: ListedEntry[], { kind, family, control }: BrowseQuestion): Facet[] {
  const kinds = count('kind', KINDS, (value) => all.filter(({ entry }) => entry.kind === value).length);
  if (kind !== 'material') return kinds;
  const materials = all.filter((each) => each.family);
  return [
    ...kinds,
    ...count(
      'family',
      FAMILIES,
      (value) => materials.filter((each) => each.family === value && (!control || each.control === control)).length,
    ),
    ...count(
      'control',
      CONTROLS,
      (value) => materials.filter((each) => each.control === value && (!family || each.family === family)).length,
    ),
  ];
}

/** A page of the library under the facets an address names; what it names wrongly is passed over. */
export async function browse(address: BrowseAddress): Promise<Browsed> {
  const { library } = await liveLibrary();
  const question = readAddress(address);
  const all = library.entries.map(listed);
  const wanted = all
    .filter(({ entry }) => !question.kind || entry.kind === question.kind)
    .filter(({ family }) => !question.family || family === question.family)
    .filter(({ control }) => !question.control || control === question.control)
    .sort((a, b) => a.entry.title.localeCompare(b.entry.title, 'en-GB'));
  const pages = Math.max(1, Math.ceil(wanted.length / PER_PAGE));
  const page = Math.min(Math.max(1, question.page), pages);
  const entries = wanted.slice((page - 1) * PER_PAGE, page * PER_PAGE);
  return {
    question: { ...question, page },
    entries,
    facets: facetsOf(all, question),
    page,
    pages,
    total: wanted.length,
  };
}
