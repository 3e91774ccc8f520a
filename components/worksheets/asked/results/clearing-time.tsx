import { ClearingFigure } from '@/components/figures/clearing-figure';
import { figure } from '@/lib/units/show';
import type { ClearingTimeResult } from '@/lib/worksheets/clearing-time/schema';
import type { ResultProps } from '../answer';

const HOUR_IN_MINUTES = 60;

/** A time as it is read off a clock: in hours from two on. */
function timeShown(seconds: number): { text: string; unit: string } {
  const minutes = seconds / 60;
  return minutes < 2 * HOUR_IN_MINUTES
    ? { text: figure(minutes), unit: 'min' }
    : { text: figure(minutes / HOUR_IN_MINUTES), unit: 'h' };
}

const told = (seconds: number) => Object.values(timeShown(seconds)).join('\u00a0');

export function ClearingTimeView({ result }: ResultProps<ClearingTimeResult>) {
  const { time, airChanges, equivalentAirChanges, perfectMixing, peak, steady } = result;
  const { text, unit } = timeShown(time);
  return (
    <div className="space-y-4">
      <div className="space-y-1">
        <h3>{time > 0 ? 'It clears in' : 'On average it never comes to that'}</h3>
        <p className="figure asked" data-result="time">
          {time > 0 ? text : '—'}
          {time > 0 && <span className="unit">{`\u2009${unit}`}</span>}
        </p>
      </div>
      <p>
        At {figure(airChanges)} air changes an hour
        {equivalentAirChanges !== undefined && `, ${figure(equivalentAirChanges)} with the filter`}
        {time > 0 && `; with perfect mixing ${told(perfectMixing)}`}.
        {peak !== undefined && ` When the source stops the room holds ${figure(peak)} mg/m³ on average.`}
        {steady !== undefined && ` Without an end it would come to ${figure(steady)} mg/m³.`}
      </p>
      <ClearingFigure result={result} />
    </div>
  );
}
