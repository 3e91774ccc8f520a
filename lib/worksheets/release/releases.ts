import { timeUntil } from '@/lib/air/decay';
import { massFromPpm, ppmFromMass } from '@/lib/chemistry/concentration';
import { massAtMost, molarMassOfFormula } from '@/lib/chemistry/release';
import { ELEMENT_RULES, ISOCYANATE_RULE, UNIT_RULES, URETHANES } from '@/lib/chemistry/release-rules';
import { cubicMetres, cubicMetresPerSecond, gramsPerMole, milligramsPerCubicMetre } from '@/lib/units/quantity';
import type { LibraryFacts, LimitFact } from '@/lib/worksheets/facts';
import type { ReleaseQuestion, ReleaseResult } from './schema';
import type { Stuff } from './stuff';

type Release = ReleaseResult['releases'][number];
/** One product at most: its mass in g, its formula, and where the bound is from. */
export type Product = { substance: string; name: string; formula: string; mass: number; source: string };

/** Every product the rules know for what is heated, at most, each as if it took all of its element. */
export function productsOf({ slug = '', elements }: Stuff, lost: number): Product[] {
  const unit = UNIT_RULES[slug];
  const rules = URETHANES.includes(slug) ? [...ELEMENT_RULES, ISOCYANATE_RULE] : ELEMENT_RULES;
  const byElement = rules.flatMap((rule) => {
    const share = elements.find(({ symbol }) => symbol === rule.element)?.massFraction ?? 0;
    const { substance, name, formula, source } = rule;
    return share > 0 ? [{ substance, name, formula, mass: massAtMost(share * lost, rule), source }] : [];
  });
  const { substance, name, formula, source } = unit ?? {};
  return unit
    ? [{ substance: substance!, name: name!, formula: formula!, mass: lost, source: source! }, ...byElement]
    : byElement;
}

const massOf = ({ value, unit }: LimitFact, molarMass: number) =>
  unit === 'ppm' ? massFromPpm(value, gramsPerMole(molarMass)) : value;

/** Bases by how soon they are passed: a short peak is held against a short limit before one of a shift. */
const BASES = ['ceiling', 'STEL', 'TWA'];

function strictest(limits: readonly LimitFact[], molarMass: number): LimitFact | undefined {
  const usable = limits.filter(({ unit, basis }) => (unit === 'ppm' || unit === 'mg/m3') && BASES.includes(basis));
  return BASES.map((basis) => usable.filter((each) => each.basis === basis))
    .find((some) => some.length > 0)
    ?.reduce((best, each) => (massOf(each, molarMass) < massOf(best, molarMass) ? each : best));
}

/** What each product comes to in the room, all at once and evenly, against its limit. */
export function inRoom(
  { substance, name, formula, mass }: Product,
  room: ReleaseQuestion['room'],
  facts: LibraryFacts,
): Release {
  const release: Release = { substance, name, massAtMost: mass };
  if (!room) return release;
  const molarMass = molarMassOfFormula(formula);
  const concentration = milligramsPerCubicMetre((1000 * mass) / room.volume);
  const limit = strictest(facts.substance(substance)?.limits ?? [], molarMass);
  const times = limit && concentration / massOf(limit, molarMass);
  const falls = times !== undefined && times > 1 && room.airflow !== undefined;
  return {
    ...release,
    concentrationAtMost: { value: concentration, unit: 'mg/m3' },
    ppmAtMost: ppmFromMass(concentration, gramsPerMole(molarMass)),
    ...(limit ? { limit, ofLimit: times } : {}),
    ...(falls
      ? { timeToLimit: timeUntil(1 / times, cubicMetresPerSecond(room.airflow!), cubicMetres(room.volume)) }
      : {}),
  };
}
