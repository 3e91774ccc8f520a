import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import { limitWords } from '@/lib/worksheets/limit-words';
import type { Cell } from '@/lib/worksheets/worksheet';
import { releaseAsk } from './ask';
import { releaseAnswer, releaseRequest, type ReleaseResult } from './schema';
import { solveRelease } from './solve';

const five = (value?: number): Cell => (value === undefined ? '' : Number(value.toPrecision(5)));
const rows = ({ releases }: ReleaseResult): Cell[][] => [
  ['Substance', 'Mass at most (g)', 'Concentration at most (mg/m3)', 'ppm at most', 'Limit', 'Times the limit'],
  ...releases.map(({ name, massAtMost, concentrationAtMost, ppmAtMost, limit, ofLimit }): Cell[] => [
    ...[name, five(massAtMost), five(concentrationAtMost?.value), five(ppmAtMost)],
    ...[limit ? limitWords(limit) : '', five(ofLimit)],
  ]),
];

/** The release worksheet. */
export const release = askedWorksheet({
  about: {
    title: 'What could it give off at most?',
    question:
      'This much of it goes up in smoke. What could its elements become at most, and what is that in this room?',
    summary:
      'From a material or a formula and the mass lost to the most acid gas, cyanide or monomer its elements allow, against limits in a room.',
    names: [
      'worst-case release',
      'stoichiometry',
      'hydrogen chloride from PVC',
      'HCN from nylon',
      'kerf mass',
      'decomposition products',
      'mass balance of fumes',
    ],
    everyday: ['how much chlorine from vinyl', 'I cut a little PVC', 'how bad is one cut', 'how much gas comes off'],
  },
  ask: releaseAsk,
  request: releaseRequest,
  answer: releaseAnswer,
  solve: solveRelease,
  rows,
  asksLibrary: true,
});
