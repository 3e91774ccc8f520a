import { AT_25 } from '@/lib/chemistry/concentration';
import { HOUR } from '@/lib/units/factors';
import { ACGIH, n, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import type { DilutionQuestion, DilutionResult } from './schema';
import type { Held } from './solve';

const CONVERSION = '29 CFR 1910.1000: 25 °C and 760 torr, 24.45 L/mol';
const MIXING_SOURCE = 'CDC, MMWR 1994;43(RR-13): K from 1 to 10';
const AIRFLOW_SOURCE = `${ACGIH}, ch. 2; ${MIXING_SOURCE}`;

function byVolume({ generation, limit, mixingFactor }: DilutionQuestion, airflow: number): Step[] {
  const { liquidRate = 0, specificGravity = 0, molarMass = 1 } = generation;
  const rate = liquidRate / HOUR;
  return [
    step('Liquid that evaporates', `ER = L / 3600 = ${n(liquidRate)} / ${HOUR}`, rate, 'L/s', 'Hours into seconds'),
    step(
      'Airflow',
      `Q = 24.12e6 SG ER K / (M C) = 24.12e6 × ${n(specificGravity)} × ${n(rate)} × ${n(mixingFactor)} / (${n(molarMass)} × ${n(limit.value)})`,
      airflow,
      'm3/s',
      `${ACGIH}, ch. 2, where it is 403e6 in US units; ${MIXING_SOURCE}`,
    ),
  ];
}

function byMass(question: DilutionQuestion, { airflow, generation, concentration }: Required<Held>): Step[] {
  const { generation: of, limit, molarMass = 1, mixingFactor } = question;
  const evaporated = step(
    'Mass that evaporates',
    `G = 1e6 SG L / 3600 = 1e6 × ${n(of.specificGravity ?? 0)} × ${n(of.liquidRate ?? 0)} / ${HOUR}`,
    generation,
    'mg/s',
    'Definition of specific gravity, a litre of water being 1 kg',
  );
  const turned = step(
    'Limit as mass',
    `ppm M / 24.45 = ${n(limit.value)} × ${n(molarMass)} / ${AT_25}`,
    concentration,
    'mg/m3',
    CONVERSION,
  );
  return [
    ...(of.massRate === undefined ? [evaporated] : []),
    ...(limit.unit === 'ppm' ? [turned] : []),
    step(
      'Airflow',
      `Q = K G / C = ${n(mixingFactor)} × ${n(generation)} / ${n(concentration)}`,
      airflow,
      'm3/s',
      AIRFLOW_SOURCE,
    ),
  ];
}

/** The working of an airflow that thins, line by line. */
export function dilutionSteps(question: DilutionQuestion, held: Held, result: DilutionResult): Step[] {
  const { airflow, generation, concentration } = held;
  return [
    ...(generation === undefined || concentration === undefined
      ? byVolume(question, airflow)
      : byMass(question, { airflow, generation, concentration })),
    step(
      'With perfect mixing',
      `Q / K = ${n(airflow)} / ${n(question.mixingFactor)}`,
      result.perfectMixing,
      'm3/s',
      MIXING_SOURCE,
    ),
  ];
}
