import { done, refuse, type Outcome } from '@/lib/outcome';
import { ATOMIC_WEIGHTS, WITHOUT_WEIGHT } from './elements';

/** Limits on a typed formula: characters, groups within groups, and one count. */
export const MAX_FORMULA = 120;
export const MAX_DEPTH = 8;
export const MAX_COUNT = 10_000;

/** How many atoms of each element, by symbol, in the order they were first written. */
export type Composition = ReadonlyMap<string, number>;
type Atoms = Map<string, number>;

const TOKEN = /(?<element>[A-Z][a-z]?)(?<of>\d*)|(?<open>[([{])|(?<close>[)\]}])(?<times>\d*)|(?<other>.)/gsu;
const DOT = /[·•⋅∙]/u;
const CLOSING: Record<string, string> = { '(': ')', '[': ']', '{': '}' };

const WRONG: Record<string, string> = {
  n: 'A chain has no one molar mass: write its repeat unit, without n.',
  '.': 'A full stop may be a decimal point or the dot of a hydrate: write the dot as ·, as in CuSO4·5H2O.',
  '+': 'A charge is not read: write the atoms only.',
  '-': 'A bond or charge is not read: write the atoms only.',
};

const add = (into: Atoms, from: Composition, times: number) =>
  from.forEach((count, symbol) => into.set(symbol, (into.get(symbol) ?? 0) + count * times));

/** The count a text states, 1 for none; not a number when it is beyond what may be written. */
const countOf = (text = '') =>
  text === '' ? 1 : /^[1-9]\d*$/.test(text) && Number(text) <= MAX_COUNT ? Number(text) : NaN;

function faultOf(symbol: string): string | undefined {
  if (Object.hasOwn(ATOMIC_WEIGHTS, symbol)) return undefined;
  if (WITHOUT_WEIGHT.has(symbol)) return `${symbol} has no standard atomic weight, since it has no stable isotope.`;
  return `${symbol} is not the symbol of an element.`;
}

/** One part between dots, without its leading count; the atoms, or what is wrong. */
function readPart(text: string): Atoms | string {
  const stack: { atoms: Atoms; closing?: string }[] = [{ atoms: new Map() }];
  for (const { groups } of text.matchAll(TOKEN)) {
    const { element, of, open, close, times, other } = groups!;
    const count = countOf(of ?? times);
    if (other !== undefined) return WRONG[other] ?? `“${other}” does not belong in a formula.`;
    if (Number.isNaN(count)) return `A count must be from 1 to ${MAX_COUNT}.`;
    if (element) {
      const fault = faultOf(element);
      if (fault) return fault;
      add(stack.at(-1)!.atoms, new Map([[element, 1]]), count);
    } else if (open) {
      if (stack.length > MAX_DEPTH) return `Groups may stand at most ${MAX_DEPTH} deep.`;
      stack.push({ atoms: new Map(), closing: CLOSING[open] });
    } else {
      const group = stack.pop()!;
      if (group.closing !== close) return `There is a ${close} that closes nothing.`;
      if (group.atoms.size === 0) return 'A group holds no element.';
      add(stack.at(-1)!.atoms, group.atoms, count);
    }
  }
  if (stack.length > 1) return `A group is not closed: a ${stack.at(-1)!.closing} is missing.`;
  return stack[0]!.atoms.size > 0 ? stack[0]!.atoms : 'A part of the formula holds no element.';
}

/**
 * Reads a chemical formula: element symbols with whole counts, groups in (), [] or {}, subscript digits, and the raised dot of a
 * hydrate with its leading count (CuSO4·5H2O). Never guesses: what can be read two ways is refused.
 * @returns the atoms, or a refusal (422) that says what to write
 */
export function parseFormula(text: string): Outcome<Composition> {
  const no = (why: string) => refuse(422, 'Not a formula', why);
  if (text.length > MAX_FORMULA) return no(`A formula may have at most ${MAX_FORMULA} characters.`);
  const formula = text.normalize('NFKC').replace(/\s+/g, '');
  if (formula === '') return no('Write a formula, such as C8H8.');
  const all: Atoms = new Map();
  for (const part of formula.split(DOT)) {
    const leading = /^\d*/.exec(part)![0];
    const times = countOf(leading);
    if (Number.isNaN(times)) return no(`A count must be from 1 to ${MAX_COUNT}.`);
    const atoms = readPart(part.slice(leading.length));
    if (typeof atoms === 'string') return no(atoms);
    add(all, atoms, times);
  }
  return done(all);
}
