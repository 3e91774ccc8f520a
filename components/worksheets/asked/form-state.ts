import type { MouseEvent } from 'react';
import type { FieldFault } from '@/lib/outcome';
import type { Typed } from '@/lib/worksheets/ask/typed';

/** What the parts of a form share. `onRow` adds or takes away a row at once; without scripts the button sends the form instead. */
export type FormState = {
  typed: Typed;
  faults: readonly FieldFault[];
  onRow?: (event: MouseEvent<HTMLButtonElement>) => void;
};
