import type { ReactNode } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import { CIRCUMSTANCES, cautionsOf } from '@/lib/worksheets/circumstances';
import type { Typed } from '@/lib/worksheets/ask/typed';
import { WarningList } from '../warning-list';

/** In place of an answer. What is ticked is warned of all the same: an alarm that has sounded waits for no number. */
export function NoAnswer({ typed, title, children }: { typed: Typed; title: string; children: ReactNode }) {
  const ticked = typed.texts.get('circumstances') ?? [];
  return (
    <div className="space-y-6">
      <WarningList warnings={cautionsOf(CIRCUMSTANCES.filter((each) => ticked.includes(each)))} />
      <EmptyState title={title}>{children}</EmptyState>
    </div>
  );
}
