import type { ReactNode } from 'react';

/** Lets a wide table scroll by itself, also from the keyboard, so that the page never does sideways. */
export function TableScroll({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div role="region" aria-label={label} tabIndex={0} className="overflow-x-auto">
      {children}
    </div>
  );
}
