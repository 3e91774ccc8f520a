import { AT_25, massFromPpm } from '@/lib/chemistry/concentration';
import { mixtureSum } from '@/lib/chemistry/mixture';
import { done, refuse, type FieldFault, type Outcome } from '@/lib/outcome';
import { gramsPerMole } from '@/lib/units/quantity';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import type { LibraryFacts, LimitFact, SubstanceFact } from '@/lib/worksheets/facts';
import { limitWords } from '@/lib/worksheets/limit-words';
import { n, step } from '@/lib/worksheets/steps';
import type { Answer, Step, Warning } from '@/lib/worksheets/worksheet';
import type { ExposureQuestion, ExposureResult } from './schema';

type Item = ExposureQuestion['items'][number];
type Judged = { item: Item; fact: SubstanceFact; limit: LimitFact; mass: number; limitMass: number };

/** mg/m3 of a concentration; undefined where ppm meets a substance without a molar mass. */
function massOf(value: number, unit: string, { molarMass }: SubstanceFact): number | undefined {
  if (unit === 'mg/m3') return value;
  return molarMass === undefined ? undefined : massFromPpm(value, gramsPerMole(molarMass));
}

/** The limit of the basis and body that is asked, the strictest of several. */
function limitFor(
  fact: SubstanceFact,
  { basis, authority }: ExposureQuestion,
): { limit: LimitFact; mass: number } | undefined {
  const usable = fact.limits.flatMap((limit) => {
    if (limit.basis !== basis || (authority && limit.authority.toLowerCase() !== authority.toLowerCase())) return [];
    if (limit.unit !== 'ppm' && limit.unit !== 'mg/m3') return [];
    const mass = massOf(limit.value, limit.unit, fact);
    return mass === undefined ? [] : [{ limit, mass }];
  });
  return usable.sort((a, b) => a.mass - b.mass)[0];
}

const held = ({ limits }: SubstanceFact) =>
  [...new Set(limits.map(({ authority, basis }) => `${authority} ${basis}`))].join(', ') || 'none';

function judge(item: Item, i: number, question: ExposureQuestion, facts: LibraryFacts): Judged | FieldFault {
  const fact = facts.substance(item.substance);
  if (!fact) return { path: `items.${i}.substance`, message: 'is not in the library' };
  const found = limitFor(fact, question);
  if (!found) {
    const whose = question.authority ? `${question.authority} ${question.basis}` : question.basis;
    return {
      path: `items.${i}.substance`,
      message: `${fact.title} has no ${whose} limit here. Held: ${held(fact)}. No limit is no permission.`,
    };
  }
  const mass = massOf(item.value, item.unit, fact);
  if (mass === undefined) return { path: `items.${i}.unit`, message: 'must be mg/m3: no molar mass is held for it' };
  return { item, fact, limit: found.limit, mass, limitMass: found.mass };
}

const isFault = (each: Judged | FieldFault): each is FieldFault => 'path' in each;

function stepsOf(judged: readonly Judged[], sum: number): Step[] {
  const turned = judged.flatMap(({ item, fact, mass, limit }) =>
    item.unit === 'ppm' || limit.unit === 'ppm'
      ? [
          step(
            `${fact.title} as mass`,
            item.unit === 'ppm' ? `ppm M / ${AT_25} = ${n(item.value)} × ${n(fact.molarMass!)} / ${AT_25}` : 'as given',
            mass,
            'mg/m3',
            '29 CFR 1910.1000: 25 °C, 760 torr',
          ),
        ]
      : [],
  );
  return [
    ...turned,
    ...judged.map(({ fact, mass, limitMass, limit }) =>
      step(
        `${fact.title}: share of its limit`,
        `C / L = ${n(mass)} / ${n(limitMass)}`,
        mass / limitMass,
        '',
        `${limitWords(limit)}: ${limit.source}`,
      ),
    ),
    step(
      'Sum of the shares',
      judged.map(({ mass, limitMass }) => n(mass / limitMass)).join(' + '),
      sum,
      '',
      '29 CFR 1910.1000(d)(2)',
    ),
  ];
}

function warningsOf(question: ExposureQuestion, judged: readonly Judged[], sum: number): Warning[] {
  const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);
  return [
    ...when(sum > 1, 'over', 'The sum is above 1. Stop the release and better the control before the work goes on.'),
    ...when(
      question.basis === 'IDLH',
      'idlh',
      'These figures are for leaving at once, not for working: nobody works in a tenth of them by plan.',
    ),
    ...when(
      judged.length > 1,
      'adds',
      'The sum holds where the effects add, as of solvents on the head. Where they do not, or are not known, each counts by itself and the sum is the cautious view.',
    ),
    {
      code: 'limit-is-no-line',
      text: 'Limits are set for healthy adult workers over a shift and are no line between harm and none. Sensitisers and carcinogens harm below them; children, the pregnant, the ill and people at home were not in mind.',
    },
    {
      code: 'one-reading',
      text: 'One reading is of one place and time: at the face, over the time that the limit is for, is what counts.',
    },
  ];
}

/**
 * How the concentrations of a mixture stand to their limits. @param question admitted by `exposureRequest`
 * @returns the answer, or a refusal (422) for a substance or a limit that the library does not hold
 */
export function solveExposure(question: ExposureQuestion, facts: LibraryFacts): Outcome<Answer<ExposureResult>> {
  const all = question.items.map((item, i) => judge(item, i, question, facts));
  const faults = all.filter(isFault);
  if (faults.length > 0) return refuse(422, 'Impossible', 'Not every substance can be held against a limit.', faults);
  const judged = all.filter((each): each is Judged => !isFault(each));
  const sum = mixtureSum(judged.map(({ mass, limitMass }) => ({ concentration: mass, limit: limitMass })));
  return done({
    result: {
      sum,
      items: judged.map(({ item, limit, mass, limitMass }) => ({
        substance: item.substance,
        ratio: mass / limitMass,
        limit,
      })),
      within: sum <= 1,
    },
    steps: stepsOf(judged, sum),
    warnings: [...cautionsOf(question.circumstances), ...warningsOf(question, judged, sum)],
  });
}
