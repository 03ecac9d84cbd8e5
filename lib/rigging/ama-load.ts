import type { MassSums } from '@/lib/rigging/sum-masses';
import type { Kilograms, Metres } from '@/lib/units/quantities';

/** What the ama carries at rest, Sy/B: statics of a beam on two floats. Source: docs/model.md §2. */
export function amaLoadAtRestKg(sums: MassSums, spanM: Metres): Kilograms {
  return sums.momentYKgM / spanM;
}
