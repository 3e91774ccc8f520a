import { PressureFigure } from '@/components/figures/pressure-figure';
import { RuledTable } from '@/components/ui/ruled-table';
import { figure, told } from '@/lib/units/show';
import type { DuctPressureQuestion, DuctPressureResult } from '@/lib/worksheets/duct-pressure/schema';
import type { ResultProps } from '../answer';
import { AskedFigure } from './asked-figure';

export function DuctPressureView({ result, question, system }: ResultProps<DuctPressureResult>) {
  const pressure = (value: number) => told('pressure', value, system);
  return (
    <div className="space-y-5">
      <AskedFigure kind="pressure" value={result.staticPressure} system={system} name="staticPressure">
        The fan must give
      </AskedFigure>
      <p>
        {pressure(result.hoodStaticPressure)} of it behind the hood. As fan catalogues define static pressure:{' '}
        {pressure(result.fanStaticPressure)}.
        {result.loadedStaticPressure !== undefined &&
          ` With the filter loaded: ${pressure(result.loadedStaticPressure)}.`}
      </p>
      <RuledTable
        label="Runs of duct"
        heads={['Run', 'Velocity', 'Friction', 'Fittings', 'Reynolds number', 'Friction factor']}
      >
        {result.runs.map((run, i) => (
          <tr key={i} className="border-b border-rule">
            <th scope="row" className="p-2 text-left">
              {i + 1}
            </th>
            <td className="figure p-2">{told('velocity', run.velocity, system)}</td>
            <td className="figure p-2">{pressure(run.friction)}</td>
            <td className="figure p-2">{pressure(run.fittings)}</td>
            <td className="figure p-2">{figure(run.reynolds)}</td>
            <td className="figure p-2">{figure(run.frictionFactor)}</td>
          </tr>
        ))}
      </RuledTable>
      <PressureFigure question={question as DuctPressureQuestion} result={result} system={system} />
    </div>
  );
}
