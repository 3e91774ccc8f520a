import { done, type Outcome } from '@/lib/outcome';
import { TYPED_UNITS } from '@/lib/units/kinds';
import { cell } from '@/lib/worksheets/cells';
import { parseRequest } from '@/lib/worksheets/parse-request';
import type { Cell } from '@/lib/worksheets/worksheet';
import { requestFrom, typedFrom } from './address';
import { hoodAirflowRequest } from './schema';
import { solveHoodAirflow } from './solve';

/** The contour of the question in an address, as rows for a spreadsheet in the units of the address. */
export function hoodTable(address: URLSearchParams): Outcome<Cell[][]> {
  const typed = typedFrom(address);
  const request = requestFrom(typed);
  const question = request.ok ? parseRequest(hoodAirflowRequest, request.value) : request;
  if (!question.ok) return question;
  const { contour } = solveHoodAirflow(question.value).result;
  const { units } = typed;
  const lines = contour.map(({ distance, velocity }) => [
    cell('length', distance, units),
    cell('velocity', velocity, units),
  ]);
  return done([[`Distance (${TYPED_UNITS.length[units]})`, `Velocity (${TYPED_UNITS.velocity[units]})`], ...lines]);
}
