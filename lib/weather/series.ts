import type { EpochMs, Knots, TrueDegrees } from '@/lib/units/quantities';

/** One instant of a typed or sampled wind. Direction is where it blows FROM, over the ground. */
export interface WindRow {
  readonly time: EpochMs;
  readonly fromDeg: TrueDegrees;
  readonly meanKn: Knots;
  readonly gustKn?: Knots;
}

/** Rows ascending in time; holds only from the first row to the last (docs/model.md §7). */
export interface WindSeries {
  readonly issuedAt?: EpochMs;
  readonly rows: readonly WindRow[];
}

/** One instant of the stream. Direction is where it sets TOWARD. */
export interface StreamRow {
  readonly time: EpochMs;
  readonly towardDeg: TrueDegrees;
  readonly kn: Knots;
}

export type Stream = { readonly kind: 'none' } | { readonly kind: 'series'; readonly rows: readonly StreamRow[] };
