import type { ReactNode } from 'react';

/** What a list says when it has nothing: why, and what to do next. */
export function EmptyState({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="space-y-2 border border-dashed border-quiet p-5">
      <p className="font-semibold">{title}</p>
      {children}
    </div>
  );
}
