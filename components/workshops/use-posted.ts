'use client';

import useSWR from 'swr';
import { useEffect, useState } from 'react';

const REST_MS = 400;

async function post<T>([url, body]: [string, string]): Promise<T> {
  const response = await fetch(url, { method: 'POST', headers: { 'content-type': 'application/json' }, body });
  const value = await response.json();
  if (response.ok) return value;
  const errors = (value.errors ?? []) as { path: string; message: string }[];
  throw new Error(errors.map(({ path, message }) => `${path}: ${message}`).join('; ') || value.detail);
}

/** The answer of the API to a body, asked anew once the body has rested; nothing is asked for null. */
export function usePosted<T>(url: string, body: object | null): { data?: T; error?: Error } {
  const text = body === null ? null : JSON.stringify(body);
  const [rested, setRested] = useState(text);
  useEffect(() => {
    const timer = setTimeout(() => setRested(text), REST_MS);
    return () => clearTimeout(timer);
  }, [text]);
  const key = rested === null ? null : ([url, rested] as [string, string]);
  return useSWR<T, Error>(key, post<T>, {
    keepPreviousData: true,
    revalidateOnFocus: false,
    shouldRetryOnError: false,
  });
}
