import { pick, randomFrom, zipfOver } from './random.mjs';

/*
 * Generated entries: invented words in the proportions of the real ones. They say nothing about any material and are made only
 * to measure speed; every title begins with "Generated".
 */

const STARTS = 'b c d f g h j k l m n p r s t v w br cr dr fl gr pl pr sl st tr'.split(' ');
const MIDDLES = 'a e i o u ai ea ou'.split(' ');
const ENDS = 'b d g k l m n p r s t nd nt rk st'.split(' ');
const FUNCTION_WORDS =
  'the of and a to in is it that for on with as at by from or this which be not are was when an its into no than so where'.split(
    ' ',
  );
const ASKING = ['can i', 'is it ok to', 'what does', 'how much', 'why does my', 'do i need', 'what is', ''];
const KINDS = ['material', 'process', 'substance', 'guide'];

function words(random, count) {
  const made = new Set();
  while (made.size < count) {
    let word = '';
    for (let syllables = 1 + Math.floor(random() * 3.4); syllables > 0; syllables -= 1)
      word += pick(random, STARTS) + pick(random, MIDDLES) + (random() < 0.5 ? pick(random, ENDS) : '');
    made.add(word);
  }
  return [...made];
}

const sentence = (draw, random, count) =>
  Array.from({ length: count }, () => (random() < 0.42 ? pick(random, FUNCTION_WORDS) : draw())).join(' ');

function casNumber(random) {
  const digits = String(10_000 + Math.floor(random() * 9_989_999));
  const check = [...digits].reverse().reduce((sum, digit, place) => sum + Number(digit) * (place + 1), 0) % 10;
  return `${digits.slice(0, -2)}-${digits.slice(-2)}-${check}`;
}

/** `count` documents in the shape the search indexes, the same ones on every run. */
export function generatedDocuments(count) {
  const random = randomFrom(20261201);
  const vocabulary = words(random, 4_000 + Math.round(2 * count));
  const draw = zipfOver(random, vocabulary);
  const rare = () => pick(random, vocabulary);
  return Array.from({ length: count }, (_, number) => {
    const kind = KINDS[number % KINDS.length];
    const own = [rare(), rare()];
    return {
      ...{ id: `${kind}:generated-${number}`, kind, slug: `generated-${number}`, url: `/generated/${number}` },
      title: `Generated ${own.join(' ')}`,
      summary: sentence(draw, random, 45),
      names: Array.from({ length: 9 }, () => (random() < 0.5 ? rare() : `${pick(random, own)} ${draw()}`)),
      codes: kind === 'guide' ? [] : [casNumber(random)],
      everyday: Array.from({ length: 7 }, () => sentence(draw, random, 4)),
      corrections: number % 5 ? [] : [{ claim: sentence(draw, random, 10), truth: sentence(draw, random, 12) }],
      related: Array.from({ length: 8 }, rare),
      text: sentence(draw, random, 420),
    };
  });
}

const typo = (random, word) => {
  const at = 1 + Math.floor(random() * (word.length - 2));
  return word.slice(0, at) + pick(random, ['a', 'e', 'n', 'r', 's', 't']) + word.slice(at + 1);
};

/** Questions put to generated documents: a name or two, a common word, asking words, one in six with a misspelling. */
export function generatedQuestions(documents, count) {
  const random = randomFrom(7);
  return Array.from({ length: count }, (_, number) => {
    const { title, names, codes, summary } = pick(random, documents);
    const own =
      number % 10 === 0 && codes[0] ? codes[0] : random() < 0.5 ? title.replace('Generated ', '') : pick(random, names);
    const common = pick(random, summary.split(' '));
    const named = number % 6 === 0 && own.length > 5 && !/\d/.test(own) ? typo(random, own) : own;
    return [pick(random, ASKING), named, number % 3 ? common : ''].filter(Boolean).join(' ');
  });
}
