import { told } from '@/lib/units/show';
import type { DilutionResult } from '@/lib/worksheets/dilution/schema';
import type { ResultProps } from '../answer';
import { AskedFigure } from './asked-figure';

export function DilutionView({ result, system }: ResultProps<DilutionResult>) {
  return (
    <div className="space-y-3">
      <AskedFigure kind="airflow" value={result.airflow} system={system} name="airflow">
        The room needs
      </AskedFigure>
      <p>With perfect mixing, which no room has, {told('airflow', result.perfectMixing, system)} would do.</p>
    </div>
  );
}
