import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import { limitWords } from '@/lib/worksheets/limit-words';
import type { Cell } from '@/lib/worksheets/worksheet';
import { exposureAsk } from './ask';
import { exposureAnswer, exposureRequest, type ExposureResult } from './schema';
import { solveExposure } from './solve';

const rows = ({ items, sum }: ExposureResult): Cell[][] => [
  ['Substance', 'Limit', 'Share of the limit'],
  ...items.map(({ substance, limit, ratio }): Cell[] => [
    ...[substance, limitWords(limit), Number(ratio.toPrecision(5))],
  ]),
  ['Sum', '', Number(sum.toPrecision(5))],
];

/** The exposure worksheet. */
export const exposure = askedWorksheet({
  about: {
    title: 'How do readings stand to their limits?',
    question: 'These substances were measured together. What share of its limit is each, and what do they add up to?',
    summary:
      'From concentrations to their shares of a body’s limit and the sum for a mixture, with the conversion between ppm and mg/m³.',
    names: [
      'exposure limit',
      'additive mixture',
      'ppm to mg/m3',
      'TWA',
      'STEL',
      'ceiling',
      'IDLH',
      'mixture rule',
      'limit check',
    ],
    everyday: ['is this reading too high', 'meter shows ppm', 'several solvents at once', 'convert ppm'],
  },
  ask: exposureAsk,
  request: exposureRequest,
  answer: exposureAnswer,
  solve: solveExposure,
  rows,
  asksLibrary: true,
});
