import type { Kilograms, Knots, Litres, Metres, SquareMetres } from '@/lib/units/quantities';

/**
 * The craft as the moments need it. Boat frame, afloat upright at her loaded waterline: y positive from the
 * vaka's centreline toward the ama (to windward), z positive up from the waterline. Source: docs/model.md §1.
 */
export interface Mass {
  readonly label: string;
  readonly kg: Kilograms;
  readonly yM: Metres;
  readonly zM: Metres;
}

export interface Vaka {
  readonly waterplaneLengthM: Metres;
  readonly waterplaneBeamM: Metres;
  /** Default 0.7·L·b. */
  readonly waterplaneAreaM2?: SquareMetres;
  /** Height of the centre of buoyancy over the waterline: zero or negative. */
  readonly buoyancyHeightM: Metres;
}

export interface Ama {
  /** Whole volume, for the reserve aback. */
  readonly volumeL?: Litres;
  /** Waterplane area at rest, for the immersion before lift-off. */
  readonly waterplaneM2?: SquareMetres;
}

export interface LeePod {
  readonly lengthM: Metres;
  readonly breadthM: Metres;
  readonly depthM: Metres;
  /** Distance of its centre to leeward of the vaka's centreline, positive. */
  readonly offsetM: Metres;
  /** Height of the middle of its bottom over the waterline. */
  readonly bottomHeightM: Metres;
}

/** Either a coefficient C, or the shed's rule "so many kg/m² at so many knots". */
export type PressureRule = { readonly coefficient: number } | { readonly kgPerM2: number; readonly atKn: Knots };

export interface Reef {
  readonly name: string;
  readonly areaM2: SquareMetres;
  readonly centreHeightM: Metres;
  readonly carryUpToMeanKn?: Knots;
  readonly carryUpToGustKn?: Knots;
  /** Share of the polar's speed with this reef. */
  readonly speedFactor: number;
}

export interface Craft {
  readonly spanM: Metres;
  readonly masses: readonly Mass[];
  readonly vaka?: Vaka;
  readonly ama?: Ama;
  readonly pod?: LeePod;
  readonly pressure: PressureRule;
  /** z of the centre of lateral resistance: zero or negative. */
  readonly centreOfLateralResistanceM: Metres;
  readonly gustFactor: number;
  readonly workingMargin: number;
  readonly windHeightExponent: number;
  /** Full sail first, least sail last. */
  readonly reefs: readonly Reef[];
}
