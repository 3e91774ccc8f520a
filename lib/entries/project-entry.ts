import type { FrontMatter } from './schema';

export type NameRow = { position: number; role: string; name: string };
export type PairRow = { position: number; process: string; control: string; reason: string; provenance: string };
export type ReleaseRow = { process: string; position: number; substance: string; form: string; known: string };
export type LimitRow = {
  position: number;
  authority: string;
  basis: string;
  value: number;
  unit: string;
  source: string;
  provenance: string;
  superseded_by: string | null;
};
export type Projection = { names: NameRow[]; pairs: PairRow[]; releases: ReleaseRow[]; limits: LimitRow[] };

function namesOf(it: FrontMatter): NameRow[] {
  const named = [
    { role: 'title', name: it.title },
    ...('abbreviation' in it && it.abbreviation ? [{ role: 'abbreviation', name: it.abbreviation }] : []),
    ...('cas' in it && it.cas ? [{ role: 'cas', name: it.cas }] : []),
    ...('formula' in it && it.formula ? [{ role: 'formula', name: it.formula }] : []),
    ...it.otherNames.map((name) => ({ role: 'other', name })),
    ...(it.everyday ?? []).map((name) => ({ role: 'everyday', name })),
  ];
  return named.map((row, position) => ({ position, ...row }));
}

/** The table rows that follow from one published entry. Pure, so that they can be rebuilt from the text at any time. */
export function projectEntry(it: FrontMatter): Projection {
  const pairs = it.kind === 'material' ? it.pairs : [];
  const limits = it.kind === 'substance' ? it.limits : [];
  return {
    names: namesOf(it),
    pairs: pairs.map(({ process, control, reason, provenance }, position) => ({
      position,
      process,
      control,
      reason,
      provenance,
    })),
    releases: pairs.flatMap((pair) =>
      pair.releases.map(({ substance, form, known }, position) => ({
        process: pair.process,
        position,
        substance,
        form,
        known,
      })),
    ),
    limits: limits.map(({ authority, basis, value, unit, source, provenance, supersededBy }, position) => ({
      ...{ position, authority, basis, value, unit, source, provenance },
      superseded_by: supersededBy ?? null,
    })),
  };
}
