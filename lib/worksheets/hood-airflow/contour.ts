import { diameterOf } from '@/lib/air/face';
import { faceAreaOf, velocityAt, type Hood } from '@/lib/air/hood-airflow';
import { faceVelocity } from '@/lib/air/enclosure';
import { metres, type CubicMetresPerSecond, type Metres } from '@/lib/units/quantity';

/** Where the velocity is told, in multiples of the distance asked for. */
const MULTIPLES = [0, 0.25, 0.5, 0.75, 1, 1.25, 1.5, 2];

/** A line of the table: the velocity in m/s that the airflow gives at a distance in m. */
export type Reach = { distance: number; velocity: number };

/**
 * How the velocity falls with the distance from the hood at one airflow. At the opening stands the mean face velocity; between it and
 * the distance from which the equation gives no more than that, nothing is told, since the equation fails there. For a canopy the
 * distances are heights; an enclosure holds at its openings and has that one line.
 * @param asked the distance of the question, always among the lines
 */
export function contourOf(hood: Hood, airflow: CubicMetresPerSecond, asked: Metres): Reach[] {
  if (hood.hood === 'enclosure') return [{ distance: 0, velocity: velocityAt(hood, airflow, asked) }];
  const atFace = faceVelocity(airflow, faceAreaOf(hood, asked));
  const step = asked > 0 || hood.hood === 'canopy' ? asked : diameterOf(hood.face);
  const lines = MULTIPLES.filter((times) => times > 0).map((times): Reach => {
    const distance = metres(times * step);
    return { distance, velocity: velocityAt(hood, airflow, distance) };
  });
  if (hood.hood === 'canopy') return lines;
  const reached = lines.filter(({ distance, velocity }) => velocity <= atFace || distance === asked);
  const face = { distance: 0, velocity: atFace };
  return reached.some(({ velocity }) => velocity > atFace) ? reached : [face, ...reached];
}
