import type { FieldFault } from '@/lib/outcome';
import { parseRequest } from '@/lib/worksheets/parse-request';
import type { Answer } from '@/lib/worksheets/worksheet';
import { isBlank, requestFrom, typedFrom, type Typed } from './address';
import { faultsForReader } from './faults';
import { hoodAirflowRequest, type HoodQuestion, type HoodResult } from './schema';
import { solveHoodAirflow } from './solve';

/** What an address asks and what comes of it. `faults` are sentences for the reader, by field. */
export type Asked = { typed: Typed } & (
  | { state: 'blank' }
  | { state: 'refused'; faults: FieldFault[] }
  | { state: 'answered'; question: HoodQuestion; answer: Answer<HoodResult> }
);

/** Answers the question that stands in the address of the page; never throws. */
export function askHood(address: URLSearchParams): Asked {
  const typed = typedFrom(address);
  if (isBlank(typed)) return { typed, state: 'blank' };
  const request = requestFrom(typed);
  const question = request.ok ? parseRequest(hoodAirflowRequest, request.value) : request;
  if (!question.ok) return { typed, state: 'refused', faults: faultsForReader(question.errors ?? []) };
  return { typed, state: 'answered', question: question.value, answer: solveHoodAirflow(question.value) };
}
