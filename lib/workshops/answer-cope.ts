import { answerCheck } from '@/lib/check/answer-check';
import type { Library } from '@/lib/entries/library';
import { done, refuse, type Outcome } from '@/lib/outcome';
import { toldBoth } from '@/lib/units/show';
import { cope, deliver, type Coped, type Delivered, type Need } from './cope';
import type { CopeAnswer, CopeQuestion, MatrixAnswer } from './cope-schema';
import { fixesFor, type Fix } from './fixes';
import type { Plan, PlanStation } from './plan-schema';
import { stationNamed } from './room-question';

/** The verdict in one sentence. */
function textOf(now: Coped): string {
  if (now.verdict === 'prohibited' || now.verdict === 'unknown') return now.why;
  if (now.verdict === 'cannot be judged') return 'Cannot be judged.';
  const has = `${toldBoth('airflow', now.delivered)} of the ${toldBoth('airflow', now.needed)} that this hood needs`;
  const flue =
    now.spills.length > 0
      ? ` But with everything on, the flue of the ${now.spills.join(' and the ')} is beaten: do not run it so.`
      : '';
  return now.verdict === 'meets'
    ? `Meets the need by this sum: ${has}.${flue}`
    : `Falls short by ${toldBoth('airflow', now.needed - now.delivered)}: ${has}.${flue}`;
}

/** What a pair asks of a station, from a published library. */
function needOf(library: Library, materials: string[], process: string): Need {
  const { control, capture } = answerCheck(library, materials, process);
  return { control, ...(capture ? { velocity: capture.velocity } : {}) };
}

/** One verdict as it goes out. */
function answerOf(
  { materials, process, station }: { materials: string[]; process: string; station: PlanStation },
  { control }: Need,
  now: Coped,
  fixes: Fix[],
): CopeAnswer {
  const measured = 'share' in now ? now : undefined;
  return {
    ...{ materials, process, station: station.name ?? '', control, verdict: now.verdict, text: textOf(now) },
    why: 'why' in now ? [now.why].flat() : [],
    ...(measured && {
      ...{ needed: measured.needed, delivered: measured.delivered, alone: measured.alone },
      ...{ roomPressure: measured.roomPressure, spills: measured.spills },
      ...(Number.isFinite(measured.clearing) ? { clearing: measured.clearing } : {}),
    }),
    ...(now.verdict === 'falls short' && fixes[0] ? { limiting: fixes[0].part } : {}),
    ...{ fixes, assumptions: measured?.assumptions ?? [] },
  };
}

/** “Does mine cope?”; refuses (422) a station that the workshop does not have, or one without a process. */
export function answerCope(
  library: Library,
  { workshop, station: name, material, process }: CopeQuestion,
): Outcome<CopeAnswer> {
  const station = stationNamed(workshop, name);
  const no = (path: string, message: string) =>
    refuse(422, 'Impossible', 'That cannot be judged as it stands.', [{ path, message }]);
  if (!station) return no('station', 'is not a station of this workshop');
  const chosen = process ?? station.process;
  if (!chosen) return no('process', 'is missing: the station names none');
  const need = needOf(library, material, chosen);
  const now = cope(workshop, station, need);
  return done(
    answerOf({ materials: material, process: chosen, station }, need, now, fixesFor(workshop, station, need, now)),
  );
}

function cellsOf(library: Library, plan: Plan, station: PlanStation, slugs: string[]): CopeAnswer[] {
  const process = station.process!;
  let given: Delivered | undefined;
  const delivers = () => (given ??= deliver(plan, station));
  return slugs.map((slug) => {
    const need = needOf(library, [slug], process);
    return answerOf({ materials: [slug], process, station }, need, cope(plan, station, need, delivers), []);
  });
}

/**
 * Every station of a workshop against its usual materials. What a station is delivered is solved once; what would mend it is left to
 * `answerCope`, one pair at a time.
 */
export function answerMatrix(library: Library, plan: Plan): MatrixAnswer {
  const slugs = [...new Set((plan.materials ?? []).flatMap(({ material }) => material || []))];
  const titleOf = (kind: string, slug: string) => library.byKey.get(`${kind}:${slug}`)?.title ?? slug;
  return {
    materials: slugs.map((slug) => ({ slug, title: titleOf('material', slug) })),
    rows: (plan.stations ?? []).flatMap((station) =>
      station.name && station.process
        ? [
            {
              ...{ station: station.name, process: station.process, processTitle: titleOf('process', station.process) },
              cells: cellsOf(library, plan, station, slugs),
            },
          ]
        : [],
    ),
  };
}
