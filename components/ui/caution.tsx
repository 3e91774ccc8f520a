import type { ReactNode } from 'react';

const LEFT_OUT =
  'This leaves out what it was not told: the machine and duct as built, additives and mixtures, and anybody more sensitive than a limit assumes.';

/** The three sentences that close every answer which could hurt someone. */
export function CautionLine({ leavesOut = LEFT_OUT }: { leavesOut?: string }) {
  return (
    <p>
      {leavesOut} Local codes and a licensed practitioner decide what is built and run. In an emergency leave at once,
      get everybody out, and call the local emergency number from outside.
    </p>
  );
}

/** The closing caution of a page, with what else that page has to warn of. */
export function Caution({ children, leavesOut }: { children?: ReactNode; leavesOut?: string }) {
  return (
    <aside aria-label="Caution" className="mt-10 max-w-measure space-y-2 border-l-4 border-ink pl-4 text-base">
      <p className="font-semibold">Before you rely on this</p>
      {children}
      <CautionLine leavesOut={leavesOut} />
    </aside>
  );
}
