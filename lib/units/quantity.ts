declare const unit: unique symbol;

/** A number that carries its unit in its type, so that a velocity cannot stand where an area is wanted. Costs nothing when run. */
export type Qty<U extends string> = number & { readonly [unit]: U };

export type Metres = Qty<'m'>;
export type SquareMetres = Qty<'m2'>;
export type CubicMetres = Qty<'m3'>;
export type MetresPerSecond = Qty<'m/s'>;
export type CubicMetresPerSecond = Qty<'m3/s'>;
export type Pascals = Qty<'Pa'>;
export type Celsius = Qty<'°C'>;
export type KilogramsPerCubicMetre = Qty<'kg/m3'>;
export type PascalSeconds = Qty<'Pa s'>;
export type Seconds = Qty<'s'>;
export type Watts = Qty<'W'>;
export type MilligramsPerSecond = Qty<'mg/s'>;
export type MilligramsPerCubicMetre = Qty<'mg/m3'>;
export type GramsPerMole = Qty<'g/mol'>;

/** Constructors: they state the unit of a plain number and change nothing. */
export const metres = (value: number) => value as Metres;
export const squareMetres = (value: number) => value as SquareMetres;
export const cubicMetres = (value: number) => value as CubicMetres;
export const metresPerSecond = (value: number) => value as MetresPerSecond;
export const cubicMetresPerSecond = (value: number) => value as CubicMetresPerSecond;
export const pascals = (value: number) => value as Pascals;
export const celsius = (value: number) => value as Celsius;
export const kilogramsPerCubicMetre = (value: number) => value as KilogramsPerCubicMetre;
export const seconds = (value: number) => value as Seconds;
export const watts = (value: number) => value as Watts;
export const milligramsPerSecond = (value: number) => value as MilligramsPerSecond;
export const milligramsPerCubicMetre = (value: number) => value as MilligramsPerCubicMetre;
export const gramsPerMole = (value: number) => value as GramsPerMole;
