import type { Library } from '@/lib/entries/library';
import type { Substance } from '@/lib/entries/schema';
import type { ReleasedSubstance } from './check';
import type { Verdict } from './rules';

/** What the reviewed pairs release, each substance once, with its limits in force. Superseded limits stay on the substance's page. */
export function releasesOf(library: Library, verdicts: Verdict[]): ReleasedSubstance[] {
  const found = new Map<string, ReleasedSubstance>();
  for (const release of verdicts.flatMap(({ pair }) => pair?.releases ?? [])) {
    const entry = library.byKey.get(`substance:${release.substance}`);
    if (!entry || found.has(release.substance)) continue;
    const it = entry.frontMatter as Substance;
    found.set(release.substance, {
      ...{ substance: release.substance, name: entry.title, cas: it.cas ?? null },
      ...(it.carcinogen ? { carcinogen: `IARC ${it.carcinogen.group}` } : {}),
      ...{ form: release.form, known: release.known },
      limits: it.limits
        .filter((limit) => !limit.supersededBy)
        .map(({ authority, basis, value, unit, source, provenance, averaging, as, note }) => ({
          ...{ authority, basis, value, unit, source, provenance },
          ...(averaging ? { averaging } : {}),
          ...(as ? { as } : {}),
          ...(note ? { note } : {}),
        })),
    });
  }
  return [...found.values()];
}
