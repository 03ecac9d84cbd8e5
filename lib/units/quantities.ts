/**
 * Named quantities. Each is a number that carries its unit in the type, so that the compiler refuses
 * knots where metres are wanted. The tag is optional: plain numbers (a literal, a sum) may enter, but one
 * named quantity never passes for another. See docs/decisions/0002-quantities-as-tagged-numbers.md.
 */
type Quantity<Unit extends string> = number & { readonly __unit?: Unit };

export type Knots = Quantity<'kn'>;
export type Metres = Quantity<'m'>;
export type SquareMetres = Quantity<'m2'>;
export type Litres = Quantity<'L'>;
export type NauticalMiles = Quantity<'nmi'>;
export type Kilograms = Quantity<'kg'>;
export type KilogramMetres = Quantity<'kg·m'>;
export type NewtonMetres = Quantity<'N·m'>;
export type Pascals = Quantity<'Pa'>;
export type Seconds = Quantity<'s'>;
export type Hours = Quantity<'h'>;
/** A plain angle, not a bearing: heel, wind angle off the bow, leeway. */
export type Degrees = Quantity<'deg'>;
/** A direction clockwise from true north, 0 ≤ x < 360. */
export type TrueDegrees = Quantity<'degT'>;
/** A direction clockwise from magnetic north, 0 ≤ x < 360. */
export type MagneticDegrees = Quantity<'degM'>;
/** An instant, milliseconds since 1970-01-01T00:00:00Z. */
export type EpochMs = Quantity<'epochMs'>;
