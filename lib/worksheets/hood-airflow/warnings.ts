import { areaOf, diameterOf, ratioOf, SLOT_RATIO } from '@/lib/air/face';
import { airflowOf, isSlot, type Hood } from '@/lib/air/hood-airflow';
import { weldingRowAt } from '@/lib/air/welding-table';
import { fromFpm } from '@/lib/units/convert';
import { metres, metresPerSecond, type CubicMetresPerSecond } from '@/lib/units/quantity';
import { told, toldBoth } from '@/lib/units/show';
import type { Warning } from '@/lib/worksheets/worksheet';
import { WORK, type Work } from './fields';
import type { HoodQuestion } from './schema';
import { BEFORE, FIXED } from './texts';

/** What the air of a room does by itself: 20 fpm, 0.10 m/s. Source: National Research Council, Prudent Practices (1981), p. 195. */
export const ROOM_DRAUGHT = fromFpm(20);
/** The slowest capture velocity in use, 50 fpm, from memory; the published class begins at 100 fpm. */
export const SLOWEST_CAPTURE = fromFpm(50);
/** How far the opening equations are trusted, in diameters of the opening. From memory. */
export const FARTHEST = 1.5;
/** Sides that meet the ratio to the last digit are not told apart by rounding. */
const ROUNDING = 1e-9;

type Case = { hood: Hood; question: HoodQuestion; airflow: CubicMetresPerSecond; work: ReadonlySet<Work> };
const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);

function ofVelocity({ hood, question: { velocity } }: Case): Warning[] {
  const place = hood.hood === 'enclosure' ? 'through the openings' : 'at the source';
  if (velocity < ROOM_DRAUGHT - ROUNDING)
    return [
      {
        code: 'below-draught',
        text: `The air of a room moves at about 0.10 m/s (20 fpm) by itself (NRC 1981). A velocity of ${toldBoth('velocity', velocity)} ${place} is lost in it.`,
      },
    ];
  return when(
    velocity < SLOWEST_CAPTURE - ROUNDING,
    'below-usual',
    'Slower than any usual capture velocity: the slowest published class, quiet release into quiet air, begins at 0.51 m/s (100 fpm), and 0.25 m/s (50 fpm) is the least that is used (from memory).',
  );
}

function ofRatio({ hood }: Case): Warning[] {
  if (!('face' in hood)) return [];
  const ratio = ratioOf(hood.face);
  const sides = `Its sides are as 1 to ${Number((1 / ratio).toPrecision(3))}.`;
  return [
    ...when(
      isSlot(hood) && ratio > SLOT_RATIO + ROUNDING,
      'slot-ratio',
      `${sides} A slot is at most a fifth as high as it is long: reckon this as an opening. The two equations do not join.`,
    ),
    ...when(
      !isSlot(hood) && ratio < SLOT_RATIO - ROUNDING,
      'slot-ratio',
      `${sides} An opening lower than a fifth of its length is a slot: reckon it as one. The two equations do not join.`,
    ),
  ];
}

function ofDistance({ hood, question, airflow }: Case): Warning[] {
  if (!('face' in hood)) return [];
  const { velocity, distance = 0 } = question;
  const least = velocity * areaOf(hood.face);
  const away = distance / diameterOf(hood.face);
  const half = airflowOf(hood, metresPerSecond(velocity), metres(distance / 2));
  return [
    ...when(
      !isSlot(hood) && away > FARTHEST + ROUNDING,
      'beyond-validity',
      `The source is ${Number(away.toPrecision(3))} diameters of the opening away. The equation is trusted to ${FARTHEST} (from memory); farther out any draught wins. Bring the hood nearer or take a larger one.`,
    ),
    ...when(
      airflow < least * (1 - ROUNDING),
      'too-close',
      `This near, the equation gives less than it takes to move air at that velocity through the opening itself, ${toldBoth('airflow', least)}. Use at least that.`,
    ),
    ...when(
      away > 1 + ROUNDING,
      'nearer-needs-less',
      `At half the distance the same velocity needs ${toldBoth('airflow', half)}, ${Math.round((100 * half) / airflow)} % of this.`,
    ),
  ];
}

function ofWelding({ hood, question, work }: Case): Warning[] {
  if (!work.has('welding') || hood.hood !== 'flanged-opening') return [];
  const row = weldingRowAt(metres(question.distance ?? 0));
  if (!row) return [];
  const asks = `${toldBoth('airflow', row.airflow)} for a flanged opening 3 inches wide this far from the arc, in a ${told('length', row.duct, 'us')} duct`;
  return [
    {
      code: 'welding-table',
      text: `For welding in the United States a table rules and not this sum: ${asks} (29 CFR 1910.252(c)(3)).`,
    },
  ];
}

function ofHood({ hood, work }: Case): Warning[] {
  const hot = work.has('hot');
  if (hood.hood === 'canopy') return [hot ? FIXED.hotCanopy : FIXED.coldOnly, FIXED.breathingZone];
  return [
    ...(hood.hood === 'bench-opening' ? [FIXED.bench] : []),
    ...(hood.hood === 'enclosure' ? [FIXED.borrowed] : []),
    ...(hot ? [FIXED.hotElsewhere] : []),
  ];
}

/** All there is to say before the number is used: first what the work itself forbids, then where the equation ends. */
export function warningsOf(hood: Hood, question: HoodQuestion, airflow: CubicMetresPerSecond): Warning[] {
  const work = new Set(question.work ?? []);
  const given: Case = { hood, question, airflow, work };
  const first = WORK.filter((each) => work.has(each)).flatMap((each) => BEFORE[each] ?? []);
  return [first, ofVelocity(given), ofRatio(given), ofDistance(given), ofHood(given), ofWelding(given)].flat();
}
