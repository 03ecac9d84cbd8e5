import type { Mass } from '@/lib/rigging/craft';
import type { KilogramMetres, Kilograms } from '@/lib/units/quantities';

export interface MassSums {
  /** M = Σm */
  readonly massKg: Kilograms;
  /** Sy = Σ m·y, positive toward the ama. */
  readonly momentYKgM: KilogramMetres;
  /** Sz = Σ m·z, positive up from the waterline. */
  readonly momentZKgM: KilogramMetres;
}

/** Sums of the mass items in the boat frame. Source: docs/model.md §1; first moments of mass. */
export function sumMasses(masses: readonly Mass[]): MassSums {
  let massKg = 0;
  let momentYKgM = 0;
  let momentZKgM = 0;
  for (const { kg, yM, zM } of masses) {
    massKg += kg;
    momentYKgM += kg * yM;
    momentZKgM += kg * zM;
  }
  return { massKg, momentYKgM, momentZKgM };
}
