'use client';

import useSWR from 'swr';
import type { FieldFault } from '@/lib/outcome';
import { faultsForReader } from '@/lib/worksheets/ask/faults';
import type { Ask } from '@/lib/worksheets/ask/fields';
import { requestFrom } from '@/lib/worksheets/ask/request';
import type { Typed } from '@/lib/worksheets/ask/typed';
import type { Answer } from '@/lib/worksheets/worksheet';

/** What is still missing is no mistake of whoever is typing: it is told apart from what is wrong. */
type Refused = { faults: FieldFault[]; missing: FieldFault[] };
type Reply = { answer: Answer<unknown>; question: object } | Refused;
/** `lost` means that no answer came: the form still sends the question as a page. */
export type AnswerState = { reply?: Reply; lost: boolean };

function refusedFor(ask: Ask, errors: FieldFault[]): Refused {
  const isMissing = ({ message }: FieldFault) => message.startsWith('is missing') || message.startsWith('at least one');
  return {
    faults: faultsForReader(
      ask,
      errors.filter((error) => !isMissing(error)),
    ),
    missing: faultsForReader(ask, errors.filter(isMissing)),
  };
}

const asker =
  (ask: Ask) =>
  async (body: string): Promise<Reply> => {
    const headers = { 'content-type': 'application/json' };
    const response = await fetch(`/api/worksheets/${ask.name}`, { method: 'POST', headers, body });
    const value = await response.json();
    if (response.ok) return { answer: value, question: JSON.parse(body) };
    if (response.status !== 400 && response.status !== 422) throw new Error(`answered ${response.status}`);
    return refusedFor(ask, value.errors ?? [{ path: '', message: value.detail }]);
  };

/** The answer to what is typed, asked of the API; nothing is asked before anything was changed. */
export function useAnswer(ask: Ask, typed: Typed | null): AnswerState {
  const request = typed && requestFrom(ask, typed);
  const body = request?.ok ? JSON.stringify(request.value) : null;
  const { data, error } = useSWR(body, asker(ask), {
    ...{ keepPreviousData: true, revalidateOnFocus: false, revalidateIfStale: false, shouldRetryOnError: false },
  });
  if (request && !request.ok) return { reply: refusedFor(ask, request.errors ?? []), lost: false };
  return { reply: body ? data : undefined, lost: Boolean(error) };
}
