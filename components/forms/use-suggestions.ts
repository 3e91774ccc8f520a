'use client';

import { useEffect, useRef, useState } from 'react';
import useSWR from 'swr';
import type { LoadSuggestions, Suggestion } from './suggestion';

/** Typing rests this long before a question is asked. */
const PAUSE_MS = 120;
const SHORTEST = 2;

const QUIETLY = {
  keepPreviousData: true,
  revalidateOnFocus: false,
  revalidateOnReconnect: false,
  shouldRetryOnError: false,
  dedupingInterval: 10_000,
};

/**
 * Suggestions for what stands in a field, and whether they are for exactly that. An earlier question still on its way is dropped. While
 * the next answer is awaited the last one stays.
 * @param scope tells one list of suggestions from another in the shared cache
 */
export function useSuggestions(scope: string, load: LoadSuggestions, typed: string) {
  const [asked, setAsked] = useState('');
  const running = useRef<AbortController>(null);
  useEffect(() => {
    const timer = setTimeout(() => setAsked(typed.trim()), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [typed]);
  useEffect(() => () => running.current?.abort(), []);
  const { data, error, isLoading } = useSWR<Suggestion[]>(
    asked.length < SHORTEST ? null : [scope, asked],
    () => {
      running.current?.abort();
      running.current = new AbortController();
      return load(asked, running.current.signal);
    },
    QUIETLY,
  );
  const enough = typed.trim().length >= SHORTEST;
  return { suggestions: enough && !error ? (data ?? []) : [], settled: enough && !isLoading && asked === typed.trim() };
}
