import { requestFrom } from '@/lib/worksheets/ask/request';
import { typedFrom, type Typed } from '@/lib/worksheets/ask/typed';
import type { FieldFault } from '@/lib/outcome';
import { workshopAsk, type Offers } from './ask';
import type { Plan } from './plan-schema';

/** A workshop as it is kept: the texts of its form, so that it can be left half-done and loses nothing. At most this many characters. */
export const MAX_DOCUMENT = 60_000;

const namesAt = (texts: URLSearchParams, rows: string) =>
  [...texts].filter(([path]) => new RegExp(`^${rows}\\.\\d+\\.name$`).test(path)).map(([, text]) => text.trim());

/** What the form of a kept workshop offers, with the names that are written in it. */
export const offersOf = (document: string, library: Pick<Offers, 'processes' | 'materials'>): Offers => {
  const texts = new URLSearchParams(document);
  return { ...library, rooms: namesAt(texts, 'rooms'), exhausts: namesAt(texts, 'exhausts') };
};

/** A kept workshop as typed, as a plan in SI, and what of it is no number. Rows in which nothing is written yet are left out. */
export function readDocument(document: string, offers: Offers): { typed: Typed; plan: Plan; faults: FieldFault[] } {
  const ask = workshopAsk(offers);
  const typed = typedFrom(ask, new URLSearchParams(document));
  const read = requestFrom(ask, typed);
  return { typed, plan: read.ok ? (pruned(read.value) as Plan) : {}, faults: read.ok ? [] : (read.errors ?? []) };
}

const isEmpty = (value: unknown): boolean =>
  value === undefined ||
  (Array.isArray(value)
    ? value.length === 0
    : typeof value === 'object' && value !== null && Object.values(value).every(isEmpty));

/** The same without rows and groups that hold nothing. */
function pruned(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(pruned).filter((each) => !isEmpty(each));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .map(([key, each]) => [key, pruned(each)] as const)
      .filter(([, each]) => !isEmpty(each)),
  );
}
