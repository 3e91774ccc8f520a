'use client';

import { useCallback, useSyncExternalStore } from 'react';

const KEY = 'fumelore-workshop';
const CHANGED = 'fumelore-workshop-changed';
/** A workshop as it is kept in the browser; `version` grows with every save, so that two tabs do not overwrite one another unseen. */
export type Kept = { version: number; document: string };
const NOTHING: Kept = { version: 0, document: '' };

let last: { text: string | null; kept: Kept } = { text: null, kept: NOTHING };

function read(): Kept {
  const text = window.localStorage.getItem(KEY);
  if (text === last.text) return last.kept;
  let kept = NOTHING;
  try {
    const value = JSON.parse(text ?? '') as Partial<Kept>;
    if (typeof value.version === 'number' && typeof value.document === 'string') kept = value as Kept;
  } catch {
    // What another program wrote there is no workshop.
  }
  last = { text, kept };
  return kept;
}

function write(document: string): Kept {
  const kept = { version: read().version + 1, document };
  window.localStorage.setItem(KEY, JSON.stringify(kept));
  window.dispatchEvent(new Event(CHANGED));
  return kept;
}

function subscribe(changed: () => void) {
  window.addEventListener('storage', changed);
  window.addEventListener(CHANGED, changed);
  return () => {
    window.removeEventListener('storage', changed);
    window.removeEventListener(CHANGED, changed);
  };
}

/**
 * The workshop this browser keeps; null until it has been asked. `save` takes the version that was read: when another tab has saved
 * since, it keeps that and says no. `force` saves over it.
 */
export function useKept() {
  const kept = useSyncExternalStore(subscribe, read, () => null);
  const save = useCallback(
    (document: string, from: number): Kept | null => (read().version === from ? write(document) : null),
    [],
  );
  return { kept, save, force: write };
}
