'use client';

import { useCallback, useEffect, useRef } from 'react';
import { fieldId } from '@/components/forms/field-id';

/** A button that adds or takes away a row, and the path it names. */
export type Moved = { what: string; path: string };

function focusRow({ what, path }: Moved) {
  const rows = document.getElementById(fieldId(what === 'add' ? path : path.replace(/\.\d+$/, '')));
  const newest = [...(rows?.querySelectorAll(':scope > fieldset') ?? [])].at(-1);
  (what === 'add' ? newest?.querySelector<HTMLElement>('input, select') : rows)?.focus();
}

/**
 * Keeps the keyboard where a row came or went: in the first field of a new one, else on what it was one of. The form is drawn anew
 * with `times`; the function that is returned tells beforehand what is about to move.
 */
export function useRowFocus(times: number): (moved: Moved) => void {
  const next = useRef<Moved>(null);
  useEffect(() => {
    if (next.current) focusRow(next.current);
    next.current = null;
  }, [times]);
  return useCallback((moved: Moved) => {
    next.current = moved;
  }, []);
}
