/** Numbers that come out the same on every run: a linear congruence (Numerical Recipes), from 0 up to but without 1. */
function numbersFrom(start: number): () => number {
  let state = (start * 2_654_435_761 + 1) >>> 0;
  return () => (state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0) / 4_294_967_296;
}

const LETTERS = 'abcdefghijklmnopqrstuvwxyz';
const EDITS = [
  (word: string, at: number, letter: string) => word.slice(0, at) + letter + word.slice(at + 1),
  (word: string, at: number, letter: string) => word.slice(0, at) + letter + word.slice(at),
  (word: string, at: number) => word.slice(0, at) + word.slice(at + 1),
  (word: string, at: number) => word.slice(0, at) + word[at + 1] + word[at] + word.slice(at + 2),
];

/** Four misspellings of a title: a wrong, an added and a missing letter, and two swapped, in a word of five letters or more. */
export function misspelt(title: string, place: number): string[] {
  const random = numbersFrom(place);
  const words = title.match(/\p{L}{5,}/gu) ?? [];
  if (words.length === 0) return [];
  return EDITS.map((edit) => {
    const word = words[Math.floor(random() * words.length)]!;
    const at = 1 + Math.floor(random() * (word.length - 2));
    return title.replace(word, edit(word, at, LETTERS[Math.floor(random() * 26)]!));
  });
}

/** A title whose last word is in the plural, where it ends in a word of three letters or more. */
export function pluralOf(title: string): string[] {
  if (!/\p{L}{3,}$/u.test(title)) return [];
  if (/[^aeiou]y$/.test(title)) return [title.replace(/y$/, 'ies')];
  if (/(?:s|x|z|ch|sh)$/.test(title)) return [`${title}es`];
  return [`${title}s`];
}

/** A title of two or three words as one and hyphenated; of any title, each two neighbours joined. */
export function joinedTitles(title: string): string[] {
  const words = /\d/.test(title) ? [] : (title.toLowerCase().match(/\p{L}+/gu) ?? []);
  if (words.length < 2) return [];
  const pairs = words.slice(1).map((_, i) =>
    words
      .map((word, at) => (at === i ? word : ` ${word}`))
      .join('')
      .trim(),
  );
  const whole = words.length <= 3 ? [words.join(''), words.join('-')] : [];
  return [...whole, ...pairs.map((joined) => joined.replace(/\s+/g, ' '))];
}

/** British against American, as the style guides of both give them. */
const SPELLINGS = [
  ['aluminium', 'aluminum'],
  ['vapour', 'vapor'],
  ['fibre', 'fiber'],
  ['galvanised', 'galvanized'],
  ['sulph', 'sulf'],
  ['mould', 'mold'],
  ['draught', 'draft'],
  ['odour', 'odor'],
  ['colour', 'color'],
  ['neighbour', 'neighbor'],
  ['centre', 'center'],
] as const;

/** A title in the spelling of the other side of the Atlantic; none when it has no such word. */
export function otherSpellings(title: string): string[] {
  const lower = title.toLowerCase();
  return SPELLINGS.flatMap(([british, american]) => [
    ...(lower.includes(british) ? [lower.replace(british, american)] : []),
    ...(lower.includes(american) ? [lower.replace(american, british)] : []),
  ]);
}

export const casQuestions = (cas: string): string[] => [
  cas,
  `CAS ${cas}`,
  `what is ${cas}`,
  `is cas no. ${cas} bad when cut`,
];
