import { DutyFigure } from '@/components/figures/duty-figure';
import { RuledTable } from '@/components/ui/ruled-table';
import { figure, told } from '@/lib/units/show';
import type { FanDutyResult } from '@/lib/worksheets/fan-duty/schema';
import type { ResultProps } from '../answer';
import { AskedFigure } from './asked-figure';

function speedWords(speed: number | null): string {
  if (speed === null) return 'No speed of this fan gives the airflow you want through this duct.';
  return `The airflow you want takes ${figure(100 * speed)} % of the curve’s speed.`;
}

export function FanDutyView({ result, system }: ResultProps<FanDutyResult>) {
  const { airflow, staticPressure, loadedFilter, speedForAirflow, branches } = result;
  return (
    <div className="space-y-5">
      <AskedFigure kind="airflow" value={airflow} system={system} name="airflow">
        The fan moves
      </AskedFigure>
      <p>
        At {told('pressure', staticPressure, system)}.
        {loadedFilter && ` With the filter loaded ${told('airflow', loadedFilter.airflow, system)}.`}
        {speedForAirflow !== undefined && ` ${speedWords(speedForAirflow)}`}
      </p>
      {branches && (
        <RuledTable
          label="Machines on this fan"
          heads={['Machine', 'Gate', 'Gets', 'Needs', 'Velocity', 'Gate must add C']}
        >
          {branches.map((each, i) => (
            <tr key={`${i} ${each.name}`} className="border-b border-rule">
              <th scope="row" className="p-2 text-left">
                {each.name}
              </th>
              <td className="p-2">{each.gate}</td>
              <td className="figure p-2">{told('airflow', each.airflow, system)}</td>
              <td className="figure p-2">{each.wanted === undefined ? '—' : told('airflow', each.wanted, system)}</td>
              <td className="figure p-2">{told('velocity', each.velocity, system)}</td>
              <td className="figure p-2">
                {each.balancingLossFactor === undefined ? '—' : figure(each.balancingLossFactor)}
              </td>
            </tr>
          ))}
        </RuledTable>
      )}
      <DutyFigure result={result} system={system} />
    </div>
  );
}
