export type At = { airflow: number; staticPressure: number };

/** Where the line between two points passes a pressure, if it does. */
function passes(from: At, to: At, pressure: number): At[] {
  const share = (pressure - from.staticPressure) / (to.staticPressure - from.staticPressure);
  if (!(share > 0 && share < 1)) return [];
  return [{ airflow: from.airflow + share * (to.airflow - from.airflow), staticPressure: pressure }];
}

/** A curve cut off at the edges of what is drawn: it ends on the edge and not at its last point inside. */
export function cutCurve(points: readonly At[], least: number, most: number): At[] {
  return points.flatMap((point, i) => {
    const before = points[i - 1];
    const edges = before ? [least, most].flatMap((edge) => passes(before, point, edge)) : [];
    const inside = point.staticPressure >= least && point.staticPressure <= most;
    return [...edges.sort((one, other) => one.airflow - other.airflow), ...(inside ? [point] : [])];
  });
}
