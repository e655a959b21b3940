/**
 * Units at the doors, and the only conversions of the tool. Inside, plain fields carry their unit in their name.
 * US customary factors follow from the international yard and pound (1959: 1 ft = 0.3048 m, 1 lb = 0.45359237 kg)
 * and standard gravity (3rd CGPM 1901: 9.80665 m/s2); all three are exact.
 */

type Branded<U extends string> = number & { readonly unit: U };

export type Metres = Branded<'m'>;
export type SquareMetres = Branded<'m2'>;
export type CubicMetres = Branded<'m3'>;
export type Kilonewtons = Branded<'kN'>;
export type KilonewtonsPerMetre = Branded<'kN/m'>;
export type KilonewtonsPerSquareMetre = Branded<'kN/m2'>;
export type KilonewtonMetres = Branded<'kNm'>;
export type Megapascals = Branded<'MPa'>;
export type Kilograms = Branded<'kg'>;
export type Tonnes = Branded<'t'>;
export type Degrees = Branded<'deg'>;
export type Radians = Branded<'rad'>;
/** A share or slope: 0.06 is 6 %. */
export type Ratio = Branded<'1'>;

function brand<U extends string>(value: number, unit: U): Branded<U> {
  if (!Number.isFinite(value)) throw new RangeError(`expected a finite number of ${unit}, received ${value}`);
  return value as Branded<U>;
}

/** A finite number as metres. Throws RangeError on NaN or an infinity; so do the other makers below. */
export const metres = (value: number): Metres => brand(value, 'm');
/** A finite number as square metres. */
export const squareMetres = (value: number): SquareMetres => brand(value, 'm2');
/** A finite number as cubic metres. */
export const cubicMetres = (value: number): CubicMetres => brand(value, 'm3');
/** A finite number as kilonewtons. */
export const kilonewtons = (value: number): Kilonewtons => brand(value, 'kN');
/** A finite number as kilonewtons per metre. */
export const kilonewtonsPerMetre = (value: number): KilonewtonsPerMetre => brand(value, 'kN/m');
/** A finite number as kilonewtons per square metre (kPa). */
export const kilonewtonsPerSquareMetre = (value: number): KilonewtonsPerSquareMetre => brand(value, 'kN/m2');
/** A finite number as kilonewton metres. */
export const kilonewtonMetres = (value: number): KilonewtonMetres => brand(value, 'kNm');
/** A finite number as megapascals (N/mm2). */
export const megapascals = (value: number): Megapascals => brand(value, 'MPa');
/** A finite number as kilograms. */
export const kilograms = (value: number): Kilograms => brand(value, 'kg');
/** A finite number as tonnes. */
export const tonnes = (value: number): Tonnes => brand(value, 't');
/** A finite number as degrees. */
export const degrees = (value: number): Degrees => brand(value, 'deg');
/** A finite number as a ratio. */
export const ratio = (value: number): Ratio => brand(value, '1');

const FOOT_M = 0.3048;
const POUND_KG = 0.45359237;
const GRAVITY = 9.80665;
const POUND_FORCE_KN = (POUND_KG * GRAVITY) / 1000;
const INCH_M = FOOT_M / 12;

/** Feet to metres, exact. */
export const feetToMetres = (feet: number): Metres => metres(feet * FOOT_M);
/** Metres to feet. */
export const metresToFeet = (m: number): number => m / FOOT_M;
/** Inches to metres, exact. */
export const inchesToMetres = (inches: number): Metres => metres(inches * INCH_M);
/** Square metres to square feet. */
export const squareMetresToSquareFeet = (m2: number): number => m2 / (FOOT_M * FOOT_M);
/** Cubic metres to cubic yards. */
export const cubicMetresToCubicYards = (m3: number): number => m3 / (3 * FOOT_M) ** 3;
/** Kips (1000 lbf) to kilonewtons. */
export const kipsToKilonewtons = (kips: number): Kilonewtons => kilonewtons(kips * 1000 * POUND_FORCE_KN);
/** Kips per foot to kilonewtons per metre. */
export const kipsPerFootToKilonewtonsPerMetre = (kipsPerFoot: number): KilonewtonsPerMetre =>
  kilonewtonsPerMetre((kipsPerFoot * 1000 * POUND_FORCE_KN) / FOOT_M);
/** Kip feet to kilonewton metres. */
export const kipFeetToKilonewtonMetres = (kipFeet: number): KilonewtonMetres =>
  kilonewtonMetres(kipFeet * 1000 * POUND_FORCE_KN * FOOT_M);
/** Kips per square inch to megapascals. */
export const ksiToMegapascals = (ksi: number): Megapascals =>
  megapascals((ksi * POUND_FORCE_KN) / (INCH_M * INCH_M));
/** Pounds per cubic foot (weight) to kilonewtons per cubic metre. */
export const pcfToKilonewtonsPerCubicMetre = (pcf: number): number => (pcf * POUND_FORCE_KN) / FOOT_M ** 3;
/** Pounds per square foot to kilonewtons per square metre. */
export const psfToKilonewtonsPerSquareMetre = (psf: number): KilonewtonsPerSquareMetre =>
  kilonewtonsPerSquareMetre((psf * POUND_FORCE_KN) / (FOOT_M * FOOT_M));
/** Kilograms to pounds. */
export const kilogramsToPounds = (kg: number): number => kg / POUND_KG;
/** Kilograms per square metre to pounds per square foot of deck. */
export const kilogramsPerSquareMetreToPsf = (kgM2: number): number => (kgM2 / POUND_KG) * FOOT_M * FOOT_M;
/** Kilograms to tonnes. */
export const kilogramsToTonnes = (kg: number): Tonnes => tonnes(kg / 1000);
/** Weight of a mass under standard gravity, kN. */
export const weightOf = (massKg: number): Kilonewtons => kilonewtons((massKg * GRAVITY) / 1000);
/** Degrees to radians. */
export const degreesToRadians = (deg: number): Radians => brand((deg * Math.PI) / 180, 'rad');
/** Per cent to a ratio. */
export const percentToRatio = (percent: number): Ratio => ratio(percent / 100);
/** A ratio to per cent. */
export const ratioToPercent = (share: number): number => share * 100;
