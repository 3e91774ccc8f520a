'use client';

import useSWR from 'swr';
import { useEffect, useState } from 'react';
import type { FieldFault } from '@/lib/outcome';
import { HOOD_API, requestFrom, type Typed } from '@/lib/worksheets/hood-airflow/address';
import { faultsForReader } from '@/lib/worksheets/hood-airflow/faults';
import type { HoodQuestion, HoodResult } from '@/lib/worksheets/hood-airflow/schema';
import type { Answer } from '@/lib/worksheets/worksheet';

/** How long typing must rest before the question is asked. */
const REST_MS = 250;

/** What is still missing is no mistake of whoever is typing: it is told apart from what is wrong. */
type Refused = { faults: FieldFault[]; missing: FieldFault[] };
type Reply = { answer: Answer<HoodResult>; question: HoodQuestion } | Refused;
/** `lost` means that no answer came: the form still sends the question as a page. */
export type HoodState = { reply?: Reply; lost: boolean };

function refusedFor(errors: FieldFault[]): Refused {
  const isMissing = ({ message }: FieldFault) => message.startsWith('is missing');
  return {
    faults: faultsForReader(errors.filter((error) => !isMissing(error))),
    missing: faultsForReader(errors.filter(isMissing)),
  };
}

async function ask(body: string): Promise<Reply> {
  const response = await fetch(HOOD_API, { method: 'POST', headers: { 'content-type': 'application/json' }, body });
  const value = await response.json();
  if (response.ok) return { answer: value, question: JSON.parse(body) };
  if (response.status !== 400 && response.status !== 422) throw new Error(`answered ${response.status}`);
  return refusedFor(value.errors ?? []);
}

function useRested<T>(value: T): T {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), REST_MS);
    return () => clearTimeout(timer);
  }, [value]);
  return rested;
}

/** The answer to what is typed, asked of the API once typing rests; nothing is asked before anything was changed. */
export function useHoodAnswer(typed: Typed | null): HoodState {
  const request = typed && requestFrom(typed);
  const body = useRested(request?.ok ? JSON.stringify(request.value) : null);
  const { data, error } = useSWR(body, ask, {
    ...{ keepPreviousData: true, revalidateOnFocus: false, revalidateIfStale: false, shouldRetryOnError: false },
  });
  if (request && !request.ok) return { reply: refusedFor(request.errors ?? []), lost: false };
  return { reply: body ? data : undefined, lost: Boolean(error) };
}
