import type { System } from '@/lib/units/kinds';
import { showRange } from '@/lib/units/show';
import { CAPTURE_CLASSES } from '@/lib/worksheets/hood-airflow/names';

/** Which velocity to want, for whoever has no figure of their own. */
export function CaptureClasses({ system }: { system: System }) {
  return (
    <details>
      <summary>Which velocity do I want?</summary>
      <table className="mt-2">
        <caption>Capture velocity by how the air is released</caption>
        <thead>
          <tr>
            <th scope="col">Released</th>
            <th scope="col">{showRange('velocity', 1, 1, system).unit}</th>
          </tr>
        </thead>
        <tbody>
          {CAPTURE_CLASSES.map(({ release, min, max }) => (
            <tr key={release}>
              <th scope="row">{release}</th>
              <td className="figure">{showRange('velocity', min, max, system).text}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-2 text-base text-quiet">
        Heating and Ventilating 42(5), 1945, as reprinted in national air-pollution guidance; given there as 100, 100 to
        200, 200 to 500 and 500 to 2000 fpm. For an entry of the library use the velocity it states.
      </p>
    </details>
  );
}
