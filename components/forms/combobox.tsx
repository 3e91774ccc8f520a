'use client';

import { useEffect, useId, useRef, useState, type InputHTMLAttributes, type RefObject } from 'react';
import { ComboboxList, optionId } from './combobox-list';
import { suggestionsFrom, type LoadSuggestions, type Suggestion } from './suggestion';
import { useListbox } from './use-listbox';
import { useSuggestions } from './use-suggestions';

type Props = Omit<InputHTMLAttributes<HTMLInputElement>, 'value' | 'role' | 'onChange'> & {
  name: string;
  /** Names the list for those who hear it: "Materials". */
  listLabel: string;
  /** An address that answers as the search does, or a function. */
  from: string | LoadSuggestions;
  /** What happens when one is taken; without it the field holds its text. */
  onChoose?: (suggestion: Suggestion) => void;
  inputRef?: RefObject<HTMLInputElement | null>;
};

function counted(open: boolean, settled: boolean, count: number) {
  if (!settled) return '';
  if (count === 0) return 'No suggestions';
  return open ? `${count} ${count === 1 ? 'suggestion' : 'suggestions'}, arrow keys to choose` : '';
}

/**
 * A plain text field that suggests. It stays uncontrolled, so that what is typed before scripts arrive is kept, and a form that holds it
 * works without them.
 */
export function Combobox({ listLabel, from, onChoose, inputRef, className = '', ...input }: Props) {
  const own = useRef<HTMLInputElement>(null);
  const field = inputRef ?? own;
  const listId = useId();
  const [typed, setTyped] = useState('');
  const load = typeof from === 'string' ? suggestionsFrom(from) : from;
  const { suggestions, settled } = useSuggestions(typeof from === 'string' ? from : listId, load, typed);

  const list = useListbox({ count: suggestions.length, choose });
  function choose(index: number) {
    const chosen = suggestions[index];
    if (!chosen || !field.current) return;
    field.current.value = chosen.text;
    list.close();
    onChoose?.(chosen);
  }

  // Somebody may have typed before this ran.
  const { show } = list;
  useEffect(() => {
    const timer = setTimeout(() => {
      const early = field.current;
      if (!early || document.activeElement !== early || early.value === early.defaultValue) return;
      setTyped(early.value);
      show();
    });
    return () => clearTimeout(timer);
  }, [field, show]);

  return (
    <div className="relative">
      <input
        {...input}
        ref={field}
        role="combobox"
        aria-autocomplete="list"
        aria-expanded={list.open}
        aria-controls={listId}
        aria-activedescendant={list.active < 0 ? undefined : optionId(listId, list.active)}
        autoComplete="off"
        onChange={(event) => {
          setTyped(event.target.value);
          list.show();
        }}
        onKeyDown={list.onKeyDown}
        onBlur={list.close}
        className={`input ${className}`}
      />
      <ComboboxList
        {...{ id: listId, label: listLabel, choose }}
        open={list.open}
        active={list.active}
        options={suggestions}
      />
      <p role="status" className="sr-only">
        {counted(list.open, settled, suggestions.length)}
      </p>
    </div>
  );
}
