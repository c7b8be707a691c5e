/**
 * Units as types. A branded number is still a number in arithmetic, so formulas read as written; but a
 * `Deg` cannot be passed where a `Rad` is wanted. Documents (JSON) carry plain numbers; brands are given
 * once, where a document is read.
 */
declare const unit: unique symbol;
type Unit<Name extends string> = number & { readonly [unit]: Name };

/** Length in millimetres. */
export type Mm = Unit<"mm">;
/** Plane angle in radians. */
export type Rad = Unit<"rad">;
/** Plane angle in degrees, as people type and read it. */
export type Deg = Unit<"deg">;
/** Stress in megapascals (N/mm²). */
export type MPa = Unit<"MPa">;
/** Force in kilonewtons. */
export type KiloNewton = Unit<"kN">;
/** Force for each metre of bend, kN/m (numerically N/mm). */
export type KiloNewtonPerMetre = Unit<"kN/m">;
/** Density in kilograms a cubic metre. */
export type KgPerCubicMetre = Unit<"kg/m3">;

/** The unit that a document's lengths are in. */
export type LengthUnit = "mm" | "in";

export const mm = (value: number): Mm => value as Mm;
export const rad = (value: number): Rad => value as Rad;
export const deg = (value: number): Deg => value as Deg;
export const mpa = (value: number): MPa => value as MPa;
export const kiloNewton = (value: number): KiloNewton => value as KiloNewton;
export const kiloNewtonPerMetre = (value: number): KiloNewtonPerMetre => value as KiloNewtonPerMetre;
export const kgPerCubicMetre = (value: number): KgPerCubicMetre => value as KgPerCubicMetre;

export const toRad = (angle: Deg): Rad => ((angle * Math.PI) / 180) as Rad;
export const toDeg = (angle: Rad): Deg => ((angle * 180) / Math.PI) as Deg;

/** One inch is 25.4 mm exactly (international inch, 1959). */
export const MM_PER_INCH = 25.4;

/** Millimetres in one of the given unit. */
export const mmPer = (lengthUnit: LengthUnit): number => (lengthUnit === "in" ? MM_PER_INCH : 1);
