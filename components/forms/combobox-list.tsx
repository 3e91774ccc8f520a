'use client';

import { useEffect } from 'react';
import { CONTROL_WORDS } from '@/components/ui/control-words';
import { Glyph } from '@/components/ui/glyph';
import type { Suggestion } from './suggestion';

type Props = {
  id: string;
  label: string;
  open: boolean;
  active: number;
  options: Suggestion[];
  choose: (index: number) => void;
};

export const optionId = (listId: string, index: number) => `${listId}-${index}`;

function OptionText({ option: { text, note, control } }: { option: Suggestion }) {
  return (
    <>
      <span className="flex items-baseline justify-between gap-4">
        <span className="font-semibold">{text}</span>
        {note && <span className="label">{note}</span>}
      </span>
      {control && (
        <span className="flex items-center gap-1.5 text-base">
          <Glyph control={control} /> {CONTROL_WORDS[control]}
        </span>
      )}
    </>
  );
}

/** The list under a combobox. Pointing at an option must not take the focus from the field. */
export function ComboboxList({ id, label, open, active, options, choose }: Props) {
  useEffect(() => {
    if (active >= 0) document.getElementById(optionId(id, active))?.scrollIntoView?.({ block: 'nearest' });
  }, [id, active]);
  return (
    <ul
      id={id}
      role="listbox"
      aria-label={label}
      hidden={!open}
      onPointerDown={(event) => event.preventDefault()}
      className="absolute inset-x-0 top-full z-20 mt-1 max-h-[60vh] overflow-y-auto border border-quiet bg-surface shadow-lg"
    >
      {options.map((option, i) => (
        <li
          key={option.key}
          id={optionId(id, i)}
          role="option"
          aria-selected={i === active}
          onClick={() => choose(i)}
          className="option"
        >
          <OptionText option={option} />
        </li>
      ))}
    </ul>
  );
}
