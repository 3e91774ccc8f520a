import type { FieldFault } from '@/lib/outcome';
import { NO_FACTS, type LibraryFacts } from '@/lib/worksheets/facts';
import type { Answer, Worksheet } from '@/lib/worksheets/worksheet';
import { faultsForReader } from './faults';
import type { Ask } from './fields';
import { requestFrom } from './request';
import { isBlank, typedFrom, type Typed } from './typed';

/** What an address asks of a worksheet and what comes of it. `faults` are sentences for the reader, by field. */
export type Asked = { typed: Typed } & (
  | { state: 'blank' }
  | { state: 'refused'; faults: FieldFault[] }
  | { state: 'answered'; question: object; answer: Answer<unknown> }
);

/** Answers the question that stands in the address of the page; never throws. */
export function askWorksheet(
  worksheet: Pick<Worksheet, 'run'>,
  ask: Ask,
  address: URLSearchParams,
  facts: LibraryFacts = NO_FACTS,
): Asked {
  const typed = typedFrom(ask, address);
  if (isBlank(typed)) return { typed, state: 'blank' };
  const request = requestFrom(ask, typed);
  const answer = request.ok ? worksheet.run(request.value, facts) : request;
  if (request.ok && answer.ok)
    return { typed, state: 'answered', question: request.value, answer: answer.value as Answer<unknown> };
  const refused = request.ok ? answer : request;
  return {
    typed,
    state: 'refused',
    faults: refused.ok ? [] : faultsForReader(ask, refused.errors ?? [{ path: '', message: refused.detail }]),
  };
}
