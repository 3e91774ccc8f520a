import { airAt, ROOM_AIR, type Air } from '@/lib/air/air-density';
import type { DuctRun, DuctSystem, Filter } from '@/lib/air/duct-system';
import { celsius, cubicMetresPerSecond, metres, pascals } from '@/lib/units/quantity';
import type { DuctQuestion } from './duct-schema';

/** The air a question names, or the room's. */
export const airOf = (air?: { temperature?: number; altitude?: number }): Air =>
  air ? airAt(celsius(air.temperature ?? 20), metres(air.altitude ?? 0)) : ROOM_AIR;

type Run = DuctQuestion['runs'][number];

const runOf = ({ diameter, length, roughness, ...rest }: Run): DuctRun => ({
  ...rest,
  ...{ diameter: metres(diameter), length: metres(length) },
  ...(roughness === undefined ? {} : { roughness: metres(roughness) }),
});

const filterOf = ({ clean, loaded, at }: NonNullable<DuctQuestion['filter']>): Filter => ({
  ...{ clean: pascals(clean), at: cubicMetresPerSecond(at) },
  ...(loaded === undefined ? {} : { loaded: pascals(loaded) }),
});

/** The system that a question describes. An admitted question holds SI numbers, so only their types change. */
export const systemOf = ({ hood, runs, outlet, filter }: DuctQuestion): DuctSystem => ({
  ...{ entryLossFactor: hood.entryLossFactor, runs: runs.map(runOf) },
  ...{ outlet, filter: filter && filterOf(filter) },
});
