import { RoomFigure } from '@/components/figures/room-figure';
import { MonoxideLevels } from '@/components/worksheets/monoxide-levels';
import { RuledTable } from '@/components/ui/ruled-table';
import { figure, told } from '@/lib/units/show';
import type { RoomBalanceResult } from '@/lib/worksheets/room-balance/schema';
import type { ResultProps } from '../answer';
import { AskedFigure } from './asked-figure';

export function RoomBalanceView({ result, system }: ResultProps<RoomBalanceResult>) {
  const { roomPressure, exhausts, appliances, shortfall, airChangesPerHour, heat, openingNeeded } = result;
  const pressure = (value: number) => told('pressure', value, system);
  return (
    <div className="space-y-5">
      <AskedFigure kind="pressure" value={roomPressure} system={system} name="roomPressure">
        The room against outdoors, everything on
      </AskedFigure>
      <p>
        {figure(airChangesPerHour)} air changes an hour. The exhausts get {told('airflow', shortfall, system)} less than
        each has alone. The air let in takes {figure(heat / 1000)} kW to bring to the temperature of the room.
        {openingNeeded !== null && ` A further free opening of ${told('area', openingNeeded, system)} would hold it.`}
      </p>
      {appliances.length > 0 && (
        <RuledTable
          label="Flued appliances"
          heads={['Appliance', 'Flue pulls', 'Room may go to', 'With everything on']}
        >
          {appliances.map(({ name, draught, limit, spills }, i) => (
            <tr key={`${i} ${name}`} className="border-b border-rule">
              <th scope="row" className="p-2 text-left">
                {name}
              </th>
              <td className="figure p-2">{draught === null ? 'not known' : pressure(draught)}</td>
              <td className="figure p-2">{pressure(limit)}</td>
              <td className={`p-2 font-semibold ${spills ? 'text-kiln' : ''}`}>
                {spills ? 'spills: do not run it so' : 'not beaten by this sum'}
              </td>
            </tr>
          ))}
        </RuledTable>
      )}
      <RuledTable label="Exhausts" heads={['Exhaust', 'Gets', 'Alone']}>
        {exhausts.map(({ name, airflow, wanted }, i) => (
          <tr key={`${i} ${name}`} className="border-b border-rule">
            <th scope="row" className="p-2 text-left">
              {name}
            </th>
            <td className="figure p-2">{told('airflow', airflow, system)}</td>
            <td className="figure p-2">{told('airflow', wanted, system)}</td>
          </tr>
        ))}
      </RuledTable>
      {appliances.length > 0 && <MonoxideLevels />}
      <RoomFigure result={result} system={system} />
    </div>
  );
}
