import { fromCfm, fromInches, toInches } from '@/lib/units/convert';
import type { CubicMetresPerSecond, Metres } from '@/lib/units/quantity';

/** One line of the table: what a flanged opening must draw when it stands between `from` and `to` inches from the arc. */
export type WeldingRow = { from: number; to: number; airflow: CubicMetresPerSecond; duct: Metres };

const row = (from: number, to: number, cfm: number, duct: number): WeldingRow => ({
  ...{ from, to, airflow: fromCfm(cfm), duct: fromInches(duct) },
});

/**
 * Movable welding hoods with a flanged suction opening 3 inches wide, for 100 fpm in the welding zone: a table and no equation. The
 * printed rows are 4 to 6 in: 150 cfm; 6 to 8: 275; 8 to 10: 425; 10 to 12: 600, with ducts of 3, 3½, 4½ and 5½ in.
 * Source: 29 CFR 1910.252(c)(3)(i).
 */
export const WELDING_TABLE: readonly WeldingRow[] = [
  row(4, 6, 150, 3),
  row(6, 8, 275, 3.5),
  row(8, 10, 425, 4.5),
  row(10, 12, 600, 5.5),
];

/** The row for a distance in m from the arc; at a shared end the farther one. Nearer than 4 in the first; beyond 12 in none. */
export function weldingRowAt(distance: Metres): WeldingRow | undefined {
  // Rounded, so that 12 in is 12 in whether it was typed in inches or in metres.
  const inches = Number(toInches(distance).toFixed(6));
  const last = WELDING_TABLE.at(-1)!;
  return WELDING_TABLE.find(({ to }) => inches < to) ?? (inches <= last.to ? last : undefined);
}
