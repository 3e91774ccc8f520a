import { ClearingFigure } from '@/components/figures/clearing-figure';
import { figure } from '@/lib/units/show';
import type { ClearingTimeResult } from '@/lib/worksheets/clearing-time/schema';
import type { ResultProps } from '../answer';

export function ClearingTimeView({ result }: ResultProps<ClearingTimeResult>) {
  const { time, airChanges, perfectMixing, peak } = result;
  return (
    <div className="space-y-4">
      <div className="space-y-1">
        <h3>It clears in</h3>
        <p className="figure asked" data-result="time">
          {figure(time / 60)}
          <span className="unit">{'\u2009min'}</span>
        </p>
      </div>
      <p>
        At {figure(airChanges)} air changes an hour; with perfect mixing {figure(perfectMixing / 60)} min.
        {peak !== undefined && ` When the source stops the room holds ${figure(peak)} mg/m³.`}
      </p>
      <ClearingFigure result={result} />
    </div>
  );
}
