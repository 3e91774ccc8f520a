const IRREGULAR = new Map([
  ['gases', 'gas'],
  ['gasses', 'gas'],
  ['lens', 'lens'],
  ['lenses', 'lens'],
  ['leaves', 'leaf'],
  ['knives', 'knife'],
  ['shelves', 'shelf'],
  ['halves', 'half'],
  ['feet', 'foot'],
  ['teeth', 'tooth'],
  ['dies', 'die'],
  ['ceiling', 'ceiling'],
  ['indices', 'index'],
]);

const VOWEL = /[aeiouy]/;

/** A plural brought to the singular: `axes` and `boxes` lose two letters, `ies` becomes `y`, `glass` stays. */
export function singular(word: string): string {
  if (word.length < 4 || !word.endsWith('s') || /(?:ss|us|is)$/.test(word)) return word;
  if (/ies$/.test(word) && word.length > 4) return `${word.slice(0, -3)}y`;
  if (/xes$|..(?:ss|ch|sh|zz)es$/.test(word)) return word.slice(0, -2);
  return word.slice(0, -1);
}

/** The root before -ing or -ed, with a doubled letter undone (`cutting`) and a lost e given back (`curing`). */
function root(word: string): string {
  if (/[^e]ied$/.test(word) && word.length > 4) return `${word.slice(0, -3)}y`;
  const rest = /(?:ing|[^e]ed)$/.test(word) ? word.replace(/(?:ing|ed)$/, '') : word;
  if (rest === word || rest.length < 3 || !VOWEL.test(rest)) return word;
  if (/([bdgmnprt])\1$/.test(rest) && rest.length > 3) return rest.slice(0, -1);
  if (/^[^aeiou]*[aeiouy][^aeiouwxy]$/.test(rest) && rest.length === 3) return `${rest}e`;
  return /[^aeiou]u$/.test(rest) ? `${rest}e` : rest;
}

/**
 * What a word is compared as: plural, -ing and -ed taken off, then a silent e and a doubled l. Light on purpose: `printer` and
 * `printing` stay apart. Words with digits and words of three letters or fewer (ABS, gas) stay whole.
 * @example stem('sawing') === stem('saws')
 */
export function stem(word: string): string {
  if (word.length < 4 || /\d/.test(word)) return word;
  const irregular = IRREGULAR.get(word);
  if (irregular) return irregular;
  const bare = root(singular(word));
  if (bare.length > 5 && bare.endsWith('ll')) return bare.slice(0, -1);
  return bare.length > 4 && /[^e]e$/.test(bare) ? bare.slice(0, -1) : bare;
}
