import type { Warning } from '@/lib/worksheets/worksheet';
import type { ReleaseResult } from './schema';
import type { Stuff } from './stuff';

const HALOGENS = ['Cl', 'F', 'Br', 'I'];
const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);

/** All there is to say of a bound before it is used. */
export function releaseWarnings(stuff: Stuff, { elements, releases }: ReleaseResult): Warning[] {
  const halogens = [...elements.map(({ symbol }) => symbol), ...stuff.unbounded].filter((symbol) =>
    HALOGENS.includes(symbol),
  );
  const over = releases.filter(({ ofLimit = 0 }) => ofLimit > 1);
  return [
    ...when(
      halogens.length > 0,
      'halogen',
      `It holds ${[...new Set(halogens)].join(' and ')}: heat makes an acid gas of it. It is not to be heated, burnt or cut with a beam, whatever this number is.`,
    ),
    ...when(
      over.length > 0,
      'over-limit',
      `Let out into the room, ${over.map(({ name }) => name.toLowerCase()).join(' and ')} could pass a limit.`,
    ),
    ...when(
      stuff.unbounded.length > 0,
      'unbounded',
      `It also holds ${stuff.unbounded.join(', ')}, in a share the library does not state: what comes of that is not in these numbers.`,
    ),
    ...when(stuff.known.includes('memory'), 'from-memory', 'The share of the element is from memory: check it.'),
    {
      code: 'upper-bound',
      text: 'An upper bound by arithmetic, not a measurement: the most that the elements allow. That it is below some limit is no permission: additives, colours, coatings and dirt are not in the formula, and smoke and fine particles are not in this sum.',
    },
    ...when(
      releases.length === 0,
      'nothing-by-rule',
      'No rule here gives a product for these elements. That is not a finding that nothing comes off: carbon monoxide, aldehydes and fine particles come off almost anything that is burnt.',
    ),
  ];
}
