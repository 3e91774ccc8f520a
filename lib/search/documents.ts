import type { Library, PublishedEntry } from '@/lib/entries/library';
import { urlOf } from '@/lib/entries/library';
import type { FrontMatter, Material, Process, Substance } from '@/lib/entries/schema';
import { CONTROLS, type Control } from '@/lib/entries/vocabulary';
import { plainText } from './plain-text';
import { MACHINE_WORDS } from './machine-words';
import type { SearchDocument } from './search';

/** What the list of worksheets tells the search of one of them; `name` is the last part of its address. */
export type WorksheetWords = { name: string; title: string; summary: string; names: string[]; everyday: string[] };

const CAS_IN_NAME = /^(?:CAS\s*)?(\d{2,7}-\d{2}-\d)$/i;
const FORMULA = /^(?=.*\d)(?:[A-Z][a-z]?|[\d()])+$/;

const isCode = (name: string) => CAS_IN_NAME.test(name) || FORMULA.test(name.normalize('NFKC'));
const codeOf = (name: string) => CAS_IN_NAME.exec(name)?.[1] ?? name;
const present = <T>(values: (T | undefined)[]): T[] => values.filter((value) => value !== undefined);

/** The strictest control a material's pairs state; undefined without a pair. */
function strictest(material: Material): Control | undefined {
  const rungs = material.pairs.map((pair) => CONTROLS.indexOf(pair.control));
  return rungs.length > 0 ? CONTROLS[Math.max(...rungs)] : undefined;
}

type Parts = { names: string[]; codes: string[]; everyday: string[]; related: string[]; text: string[] };

const ofMaterial = (it: Material, titleOf: (key: string) => string): Parts => ({
  names: present([it.abbreviation]),
  codes: present([it.cas]),
  everyday: [],
  related: [
    it.family,
    ...it.pairs.map((pair) => titleOf(`process:${pair.process}`)),
    ...it.pairs.flatMap((pair) => pair.releases.map((release) => titleOf(`substance:${release.substance}`))),
  ],
  text: present([
    it.composition.formula,
    it.composition.note,
    ...it.pairs.flatMap((pair) => [pair.reason, pair.fire]),
    ...(it.lookAlikes ?? []).map((other) => other.tell),
    ...(it.insteadOf ?? []).map((other) => other.why),
  ]),
});

const ofProcess = (it: Process, slug: string): Parts => ({
  names: Object.hasOwn(MACHINE_WORDS, slug) ? [...MACHINE_WORDS[slug]!] : [],
  codes: [],
  everyday: [],
  related: [],
  text: [it.usual, ...[it.cautions, it.protection, it.waste, it.mishap].flat().map((claim) => claim.text)],
});

const ofSubstance = (it: Substance): Parts => ({
  names: [],
  codes: present([it.cas, it.formula]),
  everyday: [...it.symptoms, ...it.effects.map((effect) => effect.text)],
  related: [],
  text: present([it.odour?.text, it.limitsNote]),
});

function partsOf(it: FrontMatter, slug: string, titleOf: (key: string) => string): Parts {
  if (it.kind === 'material') return ofMaterial(it, titleOf);
  if (it.kind === 'process') return ofProcess(it, slug);
  if (it.kind === 'substance') return ofSubstance(it);
  return { names: [], codes: [], everyday: [], related: [], text: [] };
}

function documentOf(entry: PublishedEntry, titleOf: (key: string) => string): SearchDocument {
  const { kind, slug, frontMatter: it } = entry;
  const parts = partsOf(it, slug, titleOf);
  const control = it.kind === 'material' ? strictest(it) : undefined;
  const links = (it.related ?? []).map(titleOf);
  return {
    ...{ id: `${kind}:${slug}`, kind, slug, title: entry.title, summary: it.summary, url: urlOf(kind, slug) },
    names: [...new Set([...parts.names, ...it.otherNames.filter((name) => !CAS_IN_NAME.test(name))])],
    codes: [...new Set([...parts.codes, ...it.otherNames.filter(isCode).map(codeOf)])],
    everyday: [...(it.everyday ?? []), ...parts.everyday],
    corrections: (it.corrections ?? []).map(({ claim, truth }) => ({ claim, truth })),
    related: [...new Set([...parts.related, ...links])].filter(Boolean),
    text: [...parts.text, plainText(entry.body)].join('\n'),
    ...(control ? { control } : {}),
  };
}

const ofWorksheet = ({ name, title, summary, names, everyday }: WorksheetWords): SearchDocument => ({
  ...{ id: `worksheet:${name}`, kind: 'worksheet', slug: name, title, summary, url: `/worksheets/${name}` },
  ...{ names, codes: [], everyday, corrections: [], related: [], text: '' },
});

/**
 * What the search knows of a library and of the worksheets: one document a page, in the order of the library. A material's own
 * formula is running text, so that a formula finds the substance before the polymers made of it.
 */
export function documentsOf(library: Library, worksheets: readonly WorksheetWords[] = []): SearchDocument[] {
  const titleOf = (key: string) => library.byKey.get(key)?.title ?? '';
  return [...library.entries.map((entry) => documentOf(entry, titleOf)), ...worksheets.map(ofWorksheet)];
}
