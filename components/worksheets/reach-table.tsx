import type { HoodName } from '@/lib/air/hood-airflow';
import { TYPED_UNITS, inUnit, unitOf, type System } from '@/lib/units/kinds';
import { figure, show } from '@/lib/units/show';
import type { HoodResult } from '@/lib/worksheets/hood-airflow/schema';

type Props = { contour: HoodResult['contour']; asked: number; system: System; csv: string; hood: HoodName };

/** What the rows are told by: an enclosure has its openings only, a canopy its heights. */
function words(hood: HoodName): { caption: string; column: string } {
  if (hood === 'enclosure')
    return { caption: 'Velocity at the openings; nothing outside them is captured', column: 'Distance' };
  if (hood === 'canopy') return { caption: 'Velocity by the height of the canopy, at this airflow', column: 'Height' };
  return { caption: 'Velocity by distance from the hood, at this airflow', column: 'Distance' };
}

/** How fast the air moves at each distance: the numbers behind the drawing, one click away. */
export function ReachTable({ contour, asked, system, csv, hood }: Props) {
  const unit = unitOf('length', show('length', Math.max(...contour.map(({ distance }) => distance)), system).unit);
  const { caption, column } = words(hood);
  return (
    <details>
      <summary className="font-semibold">The same numbers as a table</summary>
      <table className="mt-3 max-w-md">
        <caption>{caption}</caption>
        <thead>
          <tr>
            <th scope="col">
              {column}, {unit.symbol}
            </th>
            <th scope="col">Velocity, {TYPED_UNITS.velocity[system]}</th>
          </tr>
        </thead>
        <tbody>
          {contour.map(({ distance, velocity }) => (
            <tr key={distance} className={distance === asked ? 'font-bold' : undefined}>
              <td className="figure">{figure(inUnit(distance, unit))}</td>
              <td className="figure">{show('velocity', velocity, system).text}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="no-print mt-2">
        <a href={csv} download>
          Take the table with you (CSV)
        </a>
      </p>
    </details>
  );
}
