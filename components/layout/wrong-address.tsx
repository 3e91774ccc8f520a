'use client';

import { useEffect, useState } from 'react';
import { suggestionsFrom, type Suggestion } from '@/components/forms/suggestion';

/** The words of an address, as a question: /materials/pvc-sheet → "materials pvc sheet" asks for "pvc sheet". */
export function wordsOf(path: string): string {
  let plain = path;
  try {
    plain = decodeURIComponent(path);
  } catch {
    // A broken escape is searched for as it stands.
  }
  const parts = plain.split('/').filter(Boolean);
  const telling = parts.length > 1 ? parts.slice(1) : parts;
  return telling
    .join(' ')
    .replace(/\.\w{2,5}$/, '')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
    .slice(0, 200);
}

/** Searches for the words of an address that leads nowhere, and lists what it finds. */
export function WrongAddress() {
  const [found, setFound] = useState<Suggestion[]>([]);
  useEffect(() => {
    const asked = new AbortController();
    const words = wordsOf(window.location.pathname);
    // Without an answer the page stays as it is: it has a search form.
    if (words) suggestionsFrom('/api/search?limit=5')(words, asked.signal).then(setFound, () => undefined);
    return () => asked.abort();
  }, []);
  return (
    <div aria-live="polite">
      {found.length > 0 && (
        <section aria-labelledby="perhaps" className="space-y-2">
          <h2 id="perhaps">Perhaps one of these</h2>
          <ul className="space-y-1">
            {found.map(({ key, text, note, url = '/' }) => (
              <li key={key}>
                <a href={url}>{text}</a> {note && <span className="label">{note}</span>}
              </li>
            ))}
          </ul>
        </section>
      )}
    </div>
  );
}
