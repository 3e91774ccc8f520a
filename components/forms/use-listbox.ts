'use client';

import { useCallback, useState, type KeyboardEvent } from 'react';

type Options = { count: number; choose: (index: number) => void };

/** Where the arrow keys lead: down and up go round, by way of the field itself (-1). */
const stepped = (active: number, step: 1 | -1, count: number) => {
  const next = active + step;
  return next >= count ? -1 : next < -1 ? count - 1 : next;
};

/** The keyboard of an editable combobox with a list, after the WAI-ARIA Authoring Practices: focus stays in the field. */
export function useListbox({ count, choose }: Options) {
  const [wanted, setOpen] = useState(false);
  const [marked, setActive] = useState(-1);
  const open = wanted && count > 0;
  const active = open && marked < count ? marked : -1;

  const close = () => {
    setOpen(false);
    setActive(-1);
  };
  const show = useCallback((index = -1) => {
    setOpen(true);
    setActive(index);
  }, []);
  const move = (step: 1 | -1, alone: boolean) => {
    if (alone) return step === 1 ? show() : close();
    show(stepped(active, step, count));
  };

  function onKeyDown(event: KeyboardEvent<HTMLInputElement>) {
    if (event.nativeEvent.isComposing) return;
    const { key, altKey } = event;
    if (key === 'ArrowDown' || key === 'ArrowUp') move(key === 'ArrowDown' ? 1 : -1, altKey);
    else if (key === 'Enter' && active >= 0) choose(active);
    else if (key === 'Escape' && open) close();
    else {
      // The caret moves as in any field; the mark leaves the list.
      if (key === 'Home' || key === 'End' || key === 'ArrowLeft' || key === 'ArrowRight') setActive(-1);
      return;
    }
    event.preventDefault();
  }

  return { open, active, show, close, onKeyDown };
}
