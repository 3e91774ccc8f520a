import { show } from '@/lib/units/show';
import type { Kind, System } from '@/lib/units/kinds';

type Props = { kind: Kind; value: number; system: System; name: string; children: React.ReactNode };

/** The number that was asked for, large, with what it is. */
export function AskedFigure({ kind, value, system, name, children }: Props) {
  const shown = show(kind, value, system);
  return (
    <div className="space-y-1">
      <h3>{children}</h3>
      <p className="figure asked" data-result={name}>
        {shown.text}
        <span className="unit">{`\u2009${shown.unit}`}</span>
      </p>
    </div>
  );
}
