import 'server-only';
import { answerCheck } from '@/lib/check/answer-check';
import { type CheckAnswer, checkUrl } from '@/lib/check/check';
import { MAX_MATERIALS, MAX_NAME } from '@/lib/check/schema';
import type { EntryNames } from '@/lib/entries/entry-names';
import { entryNames } from '@/lib/entries/entry-names';
import type { Library } from '@/lib/entries/library';
import type { Material, Process, Source } from '@/lib/entries/schema';
import { liveLibrary } from './live-library';
import { resolveName } from './resolve-name';

export type CheckAddress = { material?: string | string[]; process?: string | string[] };
export type CheckView = {
  answer: CheckAnswer;
  names: EntryNames;
  sources: Source[];
  materials: Material[];
  process?: Process;
  address: string;
};
export type AskedCheck = {
  title: string;
  materials: string[];
  process: string;
  errors: { material?: string; process?: string };
  view?: CheckView;
};

const list = (value: string | string[] | undefined) =>
  [value ?? []]
    .flat()
    .map((text) => text.trim().slice(0, MAX_NAME))
    .filter(Boolean);

const entryOf = <T>(library: Library, kind: string, slug: string) =>
  library.byKey.get(`${kind}:${slug}`)?.frontMatter as T | undefined;

function viewOf(library: Library, answer: CheckAnswer): CheckView {
  const process = entryOf<Process>(library, 'process', answer.process);
  return {
    ...{ answer, names: entryNames(library) },
    sources: answer.sources.flatMap(({ id }) => library.sources.get(id) ?? []),
    materials: answer.materials.flatMap((slug) => entryOf<Material>(library, 'material', slug) ?? []),
    ...(process ? { process } : {}),
    address: checkUrl(answer.materials, answer.process),
  };
}

const said = (typed: string[], names: EntryNames, kind: string, slugs: string[]) =>
  slugs.map((slug, i) => names[`${kind}:${slug}`] ?? typed[i] ?? slug).join(' with ');

/**
 * Reads the check's address as a person wrote it: names as well as slugs. A name the library does not know is kept as it stands, and
 * the answer then is that it is not identified.
 */
export async function askCheck(address: CheckAddress): Promise<AskedCheck> {
  const materials = list(address.material).slice(0, MAX_MATERIALS);
  const process = list(address.process)[0] ?? '';
  const blank = materials.length === 0 && process === '';
  if (materials.length === 0 || process === '') {
    const errors = blank
      ? {}
      : {
          ...(materials.length === 0 ? { material: 'Name a material.' } : {}),
          ...(process ? {} : { process: 'Name a process.' }),
        };
    return { title: 'Check a material and a process', materials, process, errors };
  }
  const { library, index } = await liveLibrary();
  const slugsOf = (name: string) => {
    const known = resolveName(index, 'material', name);
    return known.length > 0 ? known : [name];
  };
  const slugs = [...new Set(materials.flatMap(slugsOf))];
  const answer = answerCheck(library, slugs, resolveName(index, 'process', process)[0] ?? process);
  const view = viewOf(library, answer);
  const title = `${said(materials, view.names, 'material', answer.materials)}: ${said([process], view.names, 'process', [answer.process]).toLowerCase()}`;
  return { title, materials, process, errors: {}, view };
}
