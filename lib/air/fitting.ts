/** A fitting as the loss sees it: C times the velocity pressure of the run it is in. `k` is missing where no figure was found. */
export type Fitting = { code: string; name: string; k?: number; source: string };

const SMACNA = 'SMACNA HVAC duct construction tables, A-7';
const ASHRAE = 'ASHRAE Fundamentals (2021), ch. 21, Tables 10 and 11, at the flow ratios stated there';
const MEMORY = 'From memory';
const NONE = 'No published figure was found: use the maker’s';

const row = (code: string, name: string, source: string, k?: number): Fitting => ({ code, name, k, source });
const smooth = (radius: string, k: number) =>
  row(`elbow-90-r${radius}`, `90° smooth elbow, radius ${radius} × diameter`, SMACNA, k);
const gored = (pieces: number, radius: string, k: number) =>
  row(`elbow-90-${pieces}-piece-r${radius}`, `90° elbow of ${pieces} pieces, radius ${radius} × diameter`, SMACNA, k);
const mitred = (angle: number, k: number) => row(`mitre-${angle}`, `${angle}° mitred elbow, no vanes`, SMACNA, k);

/** Every fitting there is a name for. Loss factors of two families of tables differ, so each says which it is from. */
export const FITTINGS: readonly Fitting[] = [
  ...[smooth('0.5', 0.71), smooth('0.75', 0.33), smooth('1', 0.22), smooth('1.5', 0.15), smooth('2', 0.13)],
  smooth('2.5', 0.12),
  row('elbow-45-r1', '45° smooth elbow, radius 1 × diameter', `${SMACNA}: 0.60 of the right angle’s`, 0.132),
  row('elbow-45-r1.5', '45° smooth elbow, radius 1.5 × diameter', `${SMACNA}: 0.60 of the right angle’s`, 0.09),
  ...[gored(3, '0.5', 0.98), gored(3, '0.75', 0.54), gored(3, '1', 0.42), gored(3, '1.5', 0.34), gored(3, '2', 0.33)],
  ...[gored(4, '0.75', 0.5), gored(4, '1', 0.37), gored(4, '1.5', 0.27), gored(4, '2', 0.24)],
  ...[gored(5, '0.75', 0.46), gored(5, '1', 0.33), gored(5, '1.5', 0.24), gored(5, '2', 0.19)],
  ...[mitred(20, 0.08), mitred(30, 0.16), mitred(45, 0.34), mitred(60, 0.55), mitred(75, 0.81), mitred(90, 1.2)],
  row('wye-45-branch', '45° wye, through its branch', `${ASHRAE}: 0.45 to 0.70, the higher taken`, 0.7),
  row('tee-45-branch', 'tee with a 45° entry, through its branch', ASHRAE, 0.64),
  row('tee-branch', 'plain tee, through its branch', ASHRAE, 1.8),
  row('tee-main', 'tee or wye, straight through', ASHRAE, 0.15),
  row('branch-entry-30', 'branch entering at 30°', MEMORY, 0.18),
  row('branch-entry-45', 'branch entering at 45°', MEMORY, 0.28),
  row('reducer', 'gradual reducer, on the narrower side', MEMORY, 0.05),
  row('contraction', 'sudden narrowing, on the narrower side, at most', MEMORY, 0.5),
  row('weather-cap-1', 'weather cap one diameter above the end', MEMORY, 0.1),
  row('weather-cap-0.75', 'weather cap 0.75 diameters above the end', MEMORY, 0.18),
  row('weather-cap-0.5', 'weather cap half a diameter above the end', MEMORY, 0.73),
  row('wall-cap', 'wall cap or louvre', NONE),
  row('backdraft-damper', 'non-return damper', NONE),
  row('gate', 'gate or butterfly damper', NONE),
  row('silencer', 'silencer', NONE),
  row('other', 'another fitting', NONE),
];

const BY_CODE = new Map(FITTINGS.map((fitting) => [fitting.code, fitting]));

/** The fitting of that code, if there is one. */
export const fittingOf = (code: string) => BY_CODE.get(code);
export const FITTING_CODES = FITTINGS.map(({ code }) => code);
/** Whether the factor is nobody's printed one. */
export const isFromMemory = (fitting: Fitting) => fitting.source === MEMORY;
