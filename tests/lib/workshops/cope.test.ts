import { describe, expect, it } from 'vitest';
import { answerCope, answerMatrix } from '@/lib/workshops/answer-cope';
import { cope, neededAirflow, type Coped, type Need } from '@/lib/workshops/cope';
import { EXAMPLE_PLAN } from '@/lib/workshops/example';
import { fixesFor } from '@/lib/workshops/fixes';
import { planSchema, type Plan, type PlanStation } from '@/lib/workshops/plan-schema';
import { contentLibrary } from '../search/content-library';

const LOCAL: Need = { control: 'local exhaust', velocity: { min: 0.5, max: 0.5 } };
const station: PlanStation = {
  name: 'bench',
  exhaust: 'fan',
  process: 'soldering',
  hood: 'plain-opening',
  distance: 0.2,
  diameter: 0.1,
};
const stated = (airflow: number): Plan => ({
  rooms: [{ name: 'room', volume: 60, openings: [{ area: 2 }] }],
  exhausts: [{ name: 'fan', room: 'room', airflow }],
  stations: [station],
});
const measured = (answer: Coped) => {
  if (!('share' in answer)) throw new Error(JSON.stringify(answer));
  return answer;
};
/** By hand: 0.5 (10 × 0.04 + π 0.05²) = 0.203927 m3/s. */
const NEEDED = 0.203927;

describe('whether a station copes', () => {
  it('is what its own hood needs against what its exhaust delivers', () => {
    expect(neededAirflow(station, 0.5)).toEqual({ airflow: expect.closeTo(NEEDED, 6) });
    expect(cope(stated(0.21), station, LOCAL)).toMatchObject({
      verdict: 'meets',
      needed: expect.closeTo(NEEDED, 6),
      delivered: 0.21,
    });
    expect(cope(stated(0.1), station, LOCAL)).toMatchObject({
      verdict: 'falls short',
      share: expect.closeTo(0.1 / NEEDED, 6),
    });
  });

  it('stays prohibited, and not identified, whatever the airflow', () => {
    expect(cope(stated(50), station, { control: 'prohibited' })).toMatchObject({ verdict: 'prohibited' });
    expect(cope(stated(50), station, { control: 'unknown' })).toMatchObject({ verdict: 'unknown' });
  });

  it('cannot be judged without an enclosure where one is needed, without a velocity, or by thinning', () => {
    const why = (need: Need, plan = stated(1)) => cope(plan, station, need);
    expect(why({ ...LOCAL, control: 'enclosed exhaust' })).toMatchObject({
      verdict: 'cannot be judged',
      why: [expect.stringContaining('enclosure')],
    });
    expect(why({ control: 'local exhaust' })).toMatchObject({
      verdict: 'cannot be judged',
      why: [expect.stringContaining('velocity')],
    });
    expect(why({ ...LOCAL, control: 'general ventilation' })).toMatchObject({
      verdict: 'cannot be judged',
      why: [expect.stringContaining('dilution')],
    });
  });

  it.each([
    ['no exhaust', { exhausts: [] }, 'no exhaust'],
    ['no room', { rooms: [] }, 'not described'],
    ['no volume', { rooms: [{ name: 'room' }] }, 'volume'],
    ['no airflow', { exhausts: [{ name: 'fan', room: 'room' }] }, 'no airflow'],
    ['half a hood', { stations: [{ ...station, diameter: undefined }] }, 'diameter'],
  ] as [string, Plan, string][])('says what is missing: %s', (_, part, words) => {
    const plan = { ...stated(0.2), ...part };
    const answer = cope(plan, plan.stations![0]!, LOCAL);
    expect(answer.verdict).toBe('cannot be judged');
    expect(JSON.stringify(answer)).toContain(words);
  });

  it('delivers less with everything on than alone, and says what was assumed', () => {
    const fan = {
      curve: [
        { airflow: 0, staticPressure: 300 },
        { airflow: 0.3, staticPressure: 0 },
      ],
    };
    const runs = [{ duct: 'galvanised-steel' as const, diameter: 0.125, length: 4 }];
    const tight: Plan = {
      rooms: [{ name: 'room', volume: 60, ach50: 3 }],
      exhausts: [
        { name: 'fan', room: 'room', fan, runs },
        { name: 'hood over the oven', room: 'room', airflow: 0.15 },
      ],
      stations: [station],
    };
    const { alone, delivered, assumptions, roomPressure } = measured(cope(tight, station, LOCAL));
    expect(delivered).toBeLessThan(alone);
    expect(roomPressure).toBeLessThan(0);
    expect(assumptions.join(' ')).toMatch(/velocity pressures on entry.*stated airflow.*indoors/s);
  });
});

describe('machines on one fan', () => {
  it('each get their branch: less with every gate open than with their own alone', () => {
    const fan = {
      curve: [
        { airflow: 0, staticPressure: 500 },
        { airflow: 0.3, staticPressure: 0 },
      ],
    };
    const own = (name: string, length: number): PlanStation => ({
      ...station,
      name,
      runs: [{ duct: 'galvanised-steel', diameter: 0.1, length }],
    });
    const shop: Plan = {
      rooms: [{ name: 'room', volume: 60, openings: [{ area: 0.5 }] }],
      exhausts: [{ name: 'fan', room: 'room', fan, runs: [{ duct: 'galvanised-steel', diameter: 0.15, length: 3 }] }],
      stations: [own('near', 1), own('far', 12)],
    };
    const [near, far] = shop.stations!.map((each) => measured(cope(shop, each, LOCAL)));
    expect(far!.delivered).toBeLessThan(near!.delivered);
    expect(far!.delivered).toBeLessThan(far!.alone);
    expect(far!.assumptions.join(' ')).toContain('gates');
  });
});

describe('what would change it most', () => {
  const fixes = (plan: Plan, at: PlanStation) => {
    const now = cope(plan, at, LOCAL);
    return fixesFor(plan, at, LOCAL, now);
  };

  it('is found by solving again, the best first, and each is better than now', () => {
    const now = measured(cope(stated(0.1), station, LOCAL));
    const found = fixes(stated(0.1), station);
    expect(found[0]).toMatchObject({ code: 'nearer' });
    expect(found.map(({ share }) => share)).toEqual([...found.map(({ share }) => share)].sort((a, b) => b - a));
    for (const { share } of found) expect(share).toBeGreaterThan(now.share);
    // Half the distance: 0.5 (10 × 0.01 + π 0.05²) = 0.053927 m3/s, so 0.1 is 185 %.
    expect(found[0]!.share).toBeCloseTo(0.1 / 0.053927, 3);
  });

  it('names the slack hose, the full filter and the starved room where they are at fault', () => {
    const fan = {
      curve: [
        { airflow: 0, staticPressure: 400 },
        { airflow: 0.25, staticPressure: 0 },
      ],
    };
    const shop = (part: object, room: object = { openings: [{ area: 1 }] }): Plan => ({
      rooms: [{ name: 'room', volume: 60, ...room }],
      exhausts: [
        {
          name: 'fan',
          room: 'room',
          fan,
          runs: [{ duct: 'galvanised-steel', diameter: 0.15, length: 3 }],
          entryLossFactor: 0.5,
          ...part,
        },
      ],
      stations: [station],
    });
    const codes = (plan: Plan) => fixes(plan, station).map(({ code }) => code);
    expect(codes(shop({ runs: [{ duct: 'flexible-slack', diameter: 0.1, length: 6 }] })).slice(0, 4)).toContain('hose');
    expect(codes(shop({ filter: { clean: 20, loaded: 300, at: 0.1 } }))).toContain('filter');
    expect(codes(shop({}, { ach50: 0.5 }))).toContain('make-up');
    expect(codes(shop({}))).not.toContain('hose');
  });
});

describe('the invented workshop', () => {
  const library = contentLibrary();

  it('is a plan by its schema, and is answered from the library', () => {
    expect(planSchema.safeParse(EXAMPLE_PLAN).error).toBeUndefined();
    const answer = answerCope(library, { workshop: EXAMPLE_PLAN, station: 'laser cutter', material: ['acrylic'] });
    expect(answer).toMatchObject({
      ok: true,
      value: { control: 'enclosed exhaust', verdict: 'falls short', spills: ['water heater'] },
    });
  });

  it('keeps a prohibited pair prohibited, and a laminate with it', () => {
    for (const material of [['pvc'], ['plywood', 'pvc']])
      expect(answerCope(library, { workshop: EXAMPLE_PLAN, station: 'laser cutter', material })).toMatchObject({
        value: { verdict: 'prohibited' },
      });
    expect(
      answerCope(library, { workshop: EXAMPLE_PLAN, station: 'laser cutter', material: ['unheard-of'] }),
    ).toMatchObject({ value: { verdict: 'unknown' } });
  });

  it('has a cell for each station and usual material', () => {
    const { rows, materials } = answerMatrix(library, EXAMPLE_PLAN);
    expect(materials.map(({ title }) => title)).toContain('PVC, rigid');
    expect(rows.map(({ cells }) => cells.length)).toEqual([4, 4]);
    expect(JSON.stringify(rows)).not.toMatch(/\bsafe(ly)?\b/i);
  });

  it('refuses a station it does not have', () =>
    expect(answerCope(library, { workshop: EXAMPLE_PLAN, station: 'lathe', material: ['pvc'] })).toMatchObject({
      ok: false,
      status: 422,
      errors: [{ path: 'station' }],
    }));
});
