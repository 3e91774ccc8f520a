'use client';

import { useEffect, useRef } from 'react';
import { SYSTEMS, type System } from '@/lib/units/kinds';

const chosen = (): System | undefined => SYSTEMS.find((system) => system === document.documentElement.dataset.units);

/**
 * Calls `change` when the reader chooses other units in the bar, and once at first where the address named none. An address that
 * names its units keeps them until then.
 */
export function useChosenUnits(atFirst: boolean, change: (units: System) => void): void {
  const latest = useRef(change);
  useEffect(() => {
    latest.current = change;
  });
  useEffect(() => {
    let last = chosen();
    if (atFirst && last === 'us') latest.current(last);
    const observer = new MutationObserver(() => {
      const now = chosen();
      if (now && now !== last) latest.current(now);
      last = now;
    });
    observer.observe(document.documentElement, { attributeFilter: ['data-units'] });
    return () => observer.disconnect();
  }, [atFirst]);
}
