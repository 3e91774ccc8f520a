import type { ReactNode } from 'react';

const LOOKS = {
  demo: 'border-dashed border-quiet',
  note: 'border-rule',
  fault: 'border-kiln border-l-4',
};

type Props = { kind?: keyof typeof LOOKS; children?: ReactNode };

/** A short remark about what the page shows. Demo marks data nobody measured. */
export function Notice({ kind = 'note', children }: Props) {
  const words =
    children ?? (kind === 'demo' ? 'Invented demo data: no workshop, person or measurement here is real.' : null);
  return (
    <div
      role={kind === 'fault' ? 'alert' : 'note'}
      className={`border bg-surface px-4 py-2.5 text-base ${LOOKS[kind]}`}
    >
      {words}
    </div>
  );
}
