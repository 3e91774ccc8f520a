import type { FrontMatter } from './schema';

/** Marks in the text that stand for a kind of provenance and need no source: `[^memory]`, `[^practice]`. */
export const MARKS: Record<string, string> = { memory: 'from memory', practice: 'common practice, no source' };

const collect = (value: unknown, key: string, found: Set<string>): void => {
  if (Array.isArray(value)) for (const item of value) collect(item, key, found);
  else if (value && typeof value === 'object')
    for (const [name, child] of Object.entries(value)) collect(child, name, found);
  else if (typeof value === 'string' && ['source', 'sources', 'molarMassSource'].includes(key)) found.add(value);
};

/** Source ids cited anywhere in an entry, in the front matter (its own list left out) and in the text. */
export function citedIn(frontMatter: FrontMatter, body: string): { inFacts: Set<string>; inText: Set<string> } {
  const inFacts = new Set<string>();
  for (const [key, value] of Object.entries(frontMatter)) if (key !== 'sources') collect(value, key, inFacts);
  const inText = new Set(
    [...body.matchAll(/\[\^([a-z0-9-]+)\]/g)].map((match) => match[1]!).filter((id) => !(id in MARKS)),
  );
  return { inFacts, inText };
}

/** Faults between what an entry cites and what it lists: each cited source is listed, and each listed one is cited. */
export function citationFaults(frontMatter: FrontMatter, body: string): string[] {
  const { inFacts, inText } = citedIn(frontMatter, body);
  const cited = new Set([...inFacts, ...inText]);
  const listed = new Set(frontMatter.sources);
  return [
    ...[...cited].filter((id) => !listed.has(id)).map((id) => `${id} is cited but not listed`),
    ...[...listed].filter((id) => !cited.has(id)).map((id) => `${id} is listed but never cited`),
  ];
}
