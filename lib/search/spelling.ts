/** British letters and what they are compared as. Applied inside a word, so compounds and endings follow. */
const AMERICAN: Readonly<Record<string, string>> = {
  aluminium: 'aluminum',
  vapour: 'vapor',
  odour: 'odor',
  colour: 'color',
  neighbour: 'neighbor',
  labour: 'labor',
  vigour: 'vigor',
  fibre: 'fiber',
  centre: 'center',
  metre: 'meter',
  litre: 'liter',
  sabre: 'saber',
  sulph: 'sulf',
  mould: 'mold',
  draught: 'draft',
  grey: 'gray',
  gauge: 'gage',
  programme: 'program',
  caesium: 'cesium',
  oedema: 'edema',
  oesoph: 'esoph',
  haem: 'hem',
  anaesth: 'anesth',
  licence: 'license',
  jewellery: 'jewelry',
  aemia: 'emia',
};
const BRITISH = new RegExp(Object.keys(AMERICAN).join('|'), 'g');
/** Only where a word begins with it: `styrene` is no tyre. */
const TYRE = /^tyre/;

/** -ise and its family: after three letters or more, so that `rise` and `noise` stay; before a vowel in the verbs met here. */
const ISE =
  /(?<=[a-z]{3})is(?=(?:e|es|ed|er|ers|ing|ation|ations)$)|(?<=galvan|anod|polymer|pulver|vapor|atom|plastic|sensit)is(?!m|t)/g;
const YSE = /(?<=anal|catal|hydrol|pyrol)ys(?=e|ing)/g;

/**
 * One spelling for both sides of the Atlantic. `word` is lower case without accents; the answer is for comparison, not for reading.
 * @example sameSpelling('galvanised') === sameSpelling('galvanized')
 */
export const sameSpelling = (word: string): string =>
  word
    .replace(BRITISH, (letters) => AMERICAN[letters]!)
    .replace(TYRE, 'tire')
    .replace(ISE, 'iz')
    .replace(YSE, 'yz');
