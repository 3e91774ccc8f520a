import { dilutionAirflow, evaporationAirflow } from '@/lib/air/dilution';
import { AT_25, massFromPpm, ppmFromMass } from '@/lib/chemistry/concentration';
import {
  gramsPerMole,
  milligramsPerCubicMetre,
  milligramsPerSecond,
  type CubicMetresPerSecond,
} from '@/lib/units/quantity';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import { ACGIH, n, step } from '@/lib/worksheets/steps';
import type { Answer, Step, Warning } from '@/lib/worksheets/worksheet';
import type { DilutionQuestion, DilutionResult } from './schema';

const CONVERSION = '29 CFR 1910.1000: 25 °C and 760 torr, 24.45 L/mol';
const MIXING_SOURCE = 'CDC, MMWR 1994;43(RR-13): K from 1 to 10';

/** A release in mg/s against a limit in mg/m3, which a limit in ppm is turned into. */
function byMass(question: DilutionQuestion, rate: number): { airflow: CubicMetresPerSecond; steps: Step[] } {
  const { limit, molarMass = 0, mixingFactor: k } = question;
  const isPpm = limit.unit === 'ppm';
  const mass = isPpm ? massFromPpm(limit.value, gramsPerMole(molarMass)) : milligramsPerCubicMetre(limit.value);
  const airflow = dilutionAirflow(milligramsPerSecond(rate), mass, k);
  const turned = step(
    'Limit as mass',
    `ppm M / 24.45 = ${n(limit.value)} × ${n(molarMass)} / ${AT_25}`,
    mass,
    'mg/m3',
    CONVERSION,
  );
  const asked = step(
    'Airflow',
    `Q = K G / C = ${n(k)} × ${n(rate)} / ${n(mass)}`,
    airflow,
    'm3/s',
    `${ACGIH}, ch. 2; ${MIXING_SOURCE}`,
  );
  return { airflow, steps: isPpm ? [turned, asked] : [asked] };
}

/** A liquid that evaporates against a limit in ppm, which a limit in mg/m3 is turned into. */
function byLiquid({ generation, limit, mixingFactor: k }: DilutionQuestion) {
  const { liquidRate = 0, specificGravity = 0, molarMass = 1 } = generation;
  const mass = gramsPerMole(molarMass);
  const isPpm = limit.unit === 'ppm';
  const ppm = isPpm ? limit.value : ppmFromMass(milligramsPerCubicMetre(limit.value), mass);
  const airflow = evaporationAirflow(liquidRate / 3600, specificGravity, mass, ppm, k);
  const turned = step(
    'Limit as volume',
    `mg/m³ × 24.45 / M = ${n(limit.value)} × ${AT_25} / ${n(molarMass)}`,
    ppm,
    'ppm',
    CONVERSION,
  );
  const asked = step(
    'Airflow',
    `Q = 24.1e6 SG ER K / (M C) = 24.1e6 × ${n(specificGravity)} × ${n(liquidRate / 3600)} × ${n(k)} / (${n(molarMass)} × ${n(ppm)}), ER in L/s`,
    airflow,
    'm3/s',
    `${ACGIH}, ch. 2 (403e6 in US units); ${MIXING_SOURCE}`,
  );
  return { airflow, steps: isPpm ? [asked] : [turned, asked] };
}

/** What this sum leaves out, whatever its number. */
const WARNINGS: readonly Warning[] = [
  {
    code: 'capture-first',
    text: 'Thinning comes after catching. It is for a steady, slow release of something of low toxicity, far from faces: not for dust or fume, sensitisers, carcinogens, or anything sprayed.',
  },
  {
    code: 'not-at-the-source',
    text: 'The number is an average of the room. Beside the source, and in the path to the outlet, it is many times that.',
  },
  {
    code: 'limit-is-no-line',
    text: 'A limit is set for healthy adult workers over a shift. It is no line between harm and none, and no measure for children, homes or the whole day.',
  },
];

/**
 * Clean air that thins a steady release to a limit. SI in, SI out.
 * @param question admitted by `dilutionRequest`; sources of the equations stand in lib/air and in the steps
 */
export function solveDilution(question: DilutionQuestion): Answer<DilutionResult> {
  const { massRate } = question.generation;
  const { airflow, steps } = massRate === undefined ? byLiquid(question) : byMass(question, massRate);
  const perfectMixing = airflow / question.mixingFactor;
  const fire: Warning[] =
    massRate === undefined
      ? [
          {
            code: 'vapour-burns',
            text: 'Solvent vapour near the liquid can burn however thin the room’s average is. No flame, spark or hot surface near.',
          },
        ]
      : [];
  const perfect: Warning[] =
    question.mixingFactor === 1
      ? [{ code: 'perfect-mixing', text: 'A mixing factor of 1 is perfect mixing, which no room has.' }]
      : [];
  return {
    result: { airflow, perfectMixing },
    steps: [
      ...steps,
      step(
        'With perfect mixing',
        `Q / K = ${n(airflow)} / ${n(question.mixingFactor)}`,
        perfectMixing,
        'm3/s',
        MIXING_SOURCE,
      ),
    ],
    warnings: [...cautionsOf(question.circumstances), ...WARNINGS, ...fire, ...perfect],
  };
}
