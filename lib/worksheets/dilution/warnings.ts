import { toldBoth } from '@/lib/units/show';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import { EVEN_AIR, heavyVapour, LIMIT_IS_NO_LINE, MIXING_CONVENTION } from '@/lib/worksheets/even-air';
import type { Warning } from '@/lib/worksheets/worksheet';
import type { DilutionQuestion, DilutionResult } from './schema';

/** Above this, m3/s, a small workshop is seldom heated or its air let in again: common practice, no source. */
export const MUCH_AIR = 1;

const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);

const CAPTURE_FIRST: Warning = {
  code: 'capture-first',
  text: 'Thinning comes after catching. It is for a steady, slow release of something of low toxicity, far from faces: not for dust or fume, nor for what is toxic, strongly irritating, sensitising or carcinogenic, nor for anything sprayed.',
};

const NOT_AT_THE_SOURCE: Warning = {
  code: 'not-at-the-source',
  text: 'The number is an average of the room. Beside the source, and in the path to the outlet, it is many times that.',
};

const AS_MUCH_IN: Warning = {
  code: 'air-must-come-in',
  text: 'It is air from outdoors, and as much must come in as goes out: work out the room, above all where anything burns in it. Local codes and a licensed practitioner decide what a room must have.',
};

/** All there is to say of thinning before its number is used. */
export function dilutionWarnings(question: DilutionQuestion, { airflow }: DilutionResult): Warning[] {
  const { generation, mixingFactor, molarMass, circumstances } = question;
  const isLiquid = generation.massRate === undefined;
  return [
    ...cautionsOf(circumstances),
    CAPTURE_FIRST,
    ...when(
      airflow > MUCH_AIR,
      'much-air',
      `More than ${toldBoth('airflow', MUCH_AIR)} is more than most small workshops can let in and warm (common practice, no source). Catch it at the source, cover the liquid, or take another one.`,
    ),
    ...when(
      isLiquid,
      'vapour-burns',
      'Solvent vapour near the liquid can burn however thin the room’s average is. No flame, spark or hot surface near.',
    ),
    NOT_AT_THE_SOURCE,
    ...heavyVapour(generation.molarMass ?? molarMass),
    LIMIT_IS_NO_LINE,
    EVEN_AIR,
    ...when(mixingFactor === 1, 'perfect-mixing', 'A mixing factor of 1 is perfect mixing, which no room has.'),
    MIXING_CONVENTION,
    AS_MUCH_IN,
  ];
}
