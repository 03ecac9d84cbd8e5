/** A place as it stands in land data: longitude first, degrees, WGS 84. */
export type LonLat = readonly [lon: number, lat: number];
/** One closed ring, first place repeated at the end. */
export type Ring = readonly LonLat[];
/** Outer ring first, then holes. */
export type LandPolygon = readonly Ring[];

/** The part of the world land data speaks of. Its edges are where the data was cut, not coast. */
export interface Box {
  readonly west: number;
  readonly south: number;
  readonly east: number;
  readonly north: number;
}

/**
 * Land polygons for sending: each ring is a flat list of whole numbers, the first place and then the steps from
 * place to place, in units of 1/perDegree; the closing place is left out.
 */
export interface LandFile {
  readonly credit: string;
  readonly licence: string;
  readonly notice: string;
  readonly box: Box;
  readonly perDegree: number;
  readonly polygons: readonly (readonly (readonly number[])[])[];
}
