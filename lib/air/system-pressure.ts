import type { Air } from './air-density';
import { aboveZero } from './domain';
import { areaOfDuct, compressionOf, lossFactorOf, type DuctRun, type DuctSystem } from './duct-system';
import { DUCT_KINDS } from './duct-kind';
import { compressionFactor } from './flexible-compression';
import { frictionFactor } from './friction-factor';

type Prepared = { area: number; perVelocity: number; rough: number; along: number; fittings: number };

function prepared(run: DuctRun, air: Air): Prepared {
  const { diameter, length } = run;
  aboveZero({ diameter, density: air.density, viscosity: air.viscosity });
  return {
    area: areaOfDuct(diameter),
    perVelocity: (air.density * diameter) / air.viscosity,
    rough: (run.roughness ?? DUCT_KINDS[run.duct].roughness) / diameter,
    along: (length / diameter) * compressionFactor(diameter, compressionOf(run)),
    fittings: (run.fittings ?? []).reduce((sum, each) => sum + lossFactorOf(each), 0),
  };
}

/**
 * The static pressure in Pa that a system asks for by airflow in m3/s, as `systemLoss` reckons it, with everything that does not depend
 * on the airflow worked out once: what a solver calls hundreds of times.
 * @throws RangeError as systemLoss, when it is made
 */
export function systemPressure(system: DuctSystem, air: Air, loaded = false): (airflow: number) => number {
  const runs = system.runs.map((run) => prepared(run, air));
  if (runs.length === 0) throw new RangeError('a system has at least one run of duct');
  const { filter, entryLossFactor, outlet } = system;
  const perFlow = filter ? (loaded ? (filter.loaded ?? filter.clean) : filter.clean) / filter.at : 0;
  const last = runs.length - 1;
  const atEnd = outlet?.k ?? 0;
  return (airflow) => {
    let pressure = perFlow * airflow;
    if (airflow === 0) return pressure;
    for (let i = 0; i <= last; i += 1) {
      const { area, perVelocity, rough, along, fittings } = runs[i]!;
      const velocity = airflow / area;
      const factor = along === 0 ? 0 : along * frictionFactor(velocity * perVelocity, rough);
      const ends = (i === 0 ? 1 + entryLossFactor : 0) + (i === last ? atEnd : 0);
      pressure += ((air.density * velocity * velocity) / 2) * (factor + fittings + ends);
    }
    return pressure;
  };
}
