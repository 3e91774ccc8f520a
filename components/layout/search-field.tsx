'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useRef } from 'react';
import { Combobox } from '@/components/forms/combobox';

const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement && (target.isContentEditable || target.matches('input, textarea, select'));

/** The one search field. Without scripts it is a form; with them `/` leads to it and it suggests. */
export function SearchField() {
  const field = useRef<HTMLInputElement>(null);
  const router = useRouter();
  useEffect(() => {
    function onKeyDown(event: KeyboardEvent) {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      event.preventDefault();
      field.current?.focus();
      field.current?.select();
    }
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, []);
  return (
    <form action="/search" role="search" aria-label="Whole site">
      <label htmlFor="site-search" className="sr-only">
        Search materials, processes, substances and guides
      </label>
      <Combobox
        id="site-search"
        name="q"
        type="search"
        enterKeyHint="search"
        maxLength={200}
        placeholder="Material, process, smell or CAS number"
        aria-keyshortcuts="/"
        listLabel="Suggestions"
        from="/api/search?limit=8"
        inputRef={field}
        onChoose={({ url }) => url && router.push(url)}
      />
    </form>
  );
}
