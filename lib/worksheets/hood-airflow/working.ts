import { areaOf, diameterOf, ratioOf, type Face } from '@/lib/air/face';
import { faceAreaOf, velocityAt, type Hood } from '@/lib/air/hood-airflow';
import { metres, type CubicMetresPerSecond } from '@/lib/units/quantity';
import type { Step } from '@/lib/worksheets/worksheet';
import { EQUATIONS } from './equations';
import type { HoodQuestion } from './schema';

const GEOMETRY = 'Geometry';
const MEAN = 'Continuity: mean velocity is airflow over area';
const ACGIH = EQUATIONS['plain-opening'].source;

/** A number as it is written in the working: four figures, as they are. */
const n = (value: number) => String(Number(value.toPrecision(4)));
const step = (label: string, equation: string, value: number, unit: string, source: string): Step => ({
  ...{ label, equation, value, unit, source },
});

const areaStep = (face: Face): Step =>
  'diameter' in face
    ? step('Area of the opening', `A = π D² / 4 = π × ${n(face.diameter)}² / 4`, areaOf(face), 'm2', GEOMETRY)
    : step('Area of the opening', `A = W × H = ${n(face.width)} × ${n(face.height)}`, areaOf(face), 'm2', GEOMETRY);

/** The right side of the hood's equation with the numbers of the question; Q, V as given. */
function numbersOf(hood: Hood, velocity: string, distance: number): string {
  const x = n(distance);
  if (hood.hood === 'enclosure') return `${velocity} × ${n(hood.openArea)}`;
  if (hood.hood === 'canopy') return `1.4 × ${n(hood.perimeter)} × ${x} × ${velocity}`;
  if (hood.hood === 'plain-slot') return `3.7 × ${n(hood.face.width)} × ${velocity} × ${x}`;
  if (hood.hood === 'flanged-slot') return `2.6 × ${n(hood.face.width)} × ${velocity} × ${x}`;
  const [flange, square] = [hood.hood === 'flanged-opening' ? '0.75 × ' : '', hood.hood === 'bench-opening' ? 5 : 10];
  return `${flange}${velocity} × (${square} × ${x}² + ${n(areaOf(hood.face))})`;
}

function faceSteps(hood: Hood, distance: number): Step[] {
  if (!('face' in hood)) return [];
  const { face } = hood;
  if (hood.hood === 'plain-slot' || hood.hood === 'flanged-slot')
    return [
      step('Shorter side over longer: a slot has at most 0.2', 'H / W', ratioOf(face), '', ACGIH),
      areaStep(face),
    ];
  const diameter = diameterOf(face);
  const equal = 'diameter' in face ? `${n(distance)} / ${n(diameter)}` : `${n(distance)} / √(4 A / π)`;
  return [
    areaStep(face),
    step(
      'Distance in diameters of the opening: at most 1.5',
      `X / D = ${equal}`,
      distance / diameter,
      '',
      'From memory',
    ),
    ...(hood.hood === 'flanged-opening'
      ? [
          step(
            'Width the flange needs all round',
            'at least √A',
            Math.sqrt(areaOf(face)),
            'm',
            'Lecture notes on hood design (secondary)',
          ),
        ]
      : []),
  ];
}

const FACE_LABELS: Partial<Record<Hood['hood'], string>> = {
  enclosure: 'Mean velocity through the openings',
  canopy: 'Mean velocity through the open sides, P × D',
};

/** What the same airflow gives twice as far away; an enclosure has no such line, nor a source at the opening itself. */
function farStep(hood: Hood, airflow: CubicMetresPerSecond, distance: number): Step[] {
  if (hood.hood === 'enclosure' || distance === 0) return [];
  const [letter, where] =
    hood.hood === 'canopy' ? ['D', 'with the canopy twice as high'] : ['X', 'at twice the distance'];
  const far = metres(2 * distance);
  const { velocity, source } = EQUATIONS[hood.hood];
  const equation = `${velocity}, ${letter} = ${n(far)}, Q = ${n(airflow)}`;
  return [step(`Velocity ${where}, the airflow unchanged`, equation, velocityAt(hood, airflow, far), 'm/s', source)];
}

/** The working, line by line as it would stand on paper, SI throughout. */
export function workingOf(hood: Hood, question: HoodQuestion, airflow: CubicMetresPerSecond): Step[] {
  const { velocity, distance = 0 } = question;
  const equation = EQUATIONS[hood.hood];
  const area = faceAreaOf(hood, metres(distance));
  const numbers = numbersOf(hood, n(velocity), distance);
  const faceLabel = FACE_LABELS[hood.hood] ?? 'Mean velocity through the opening';
  return [
    ...faceSteps(hood, distance),
    step('Airflow the hood must draw', `${equation.airflow} = ${numbers}`, airflow, 'm3/s', equation.source),
    step(faceLabel, `Q / A = ${n(airflow)} / ${n(area)}`, airflow / area, 'm/s', MEAN),
    ...farStep(hood, airflow, distance),
  ];
}
