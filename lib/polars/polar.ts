import type { Degrees, Knots } from '@/lib/units/quantities';

/** Boat speed through the water by true wind speed (rows) and true wind angle (columns), both ascending. */
export interface Polar {
  readonly windSpeedsKn: readonly Knots[];
  readonly windAnglesDeg: readonly Degrees[];
  /** speedsKn[wind][angle] */
  readonly speedsKn: readonly (readonly Knots[])[];
}

/** One leeway for all angles, or by true wind angle (ascending), linear between and constant beyond. */
export type Leeway = Degrees | readonly { readonly angleDeg: Degrees; readonly leewayDeg: Degrees }[];
