import type { Vaka } from '@/lib/rigging/craft';
import { SEA_WATER_KG_M3 } from '@/lib/units/constants';
import type { Kilograms, Metres, SquareMetres } from '@/lib/units/quantities';

/** Share of the box L·b that a slender hull's waterplane fills, where the owner gives no area. Judgement, no source. */
const AREA_COEFFICIENT = 0.7;
/** cw: share of the box's L·b³/12 that its moment of inertia has. Judgement, no source. */
const INERTIA_COEFFICIENT = 0.7;

/** The vaka's own waterplane: its area, and BM = I_T/∇ with I_T ≈ cw·L·b³/12. Source: docs/model.md §2. */
export function vakaWaterplane(vaka: Vaka, massKg: Kilograms): { areaM2: SquareMetres; metacentricRadiusM: Metres } {
  const { waterplaneLengthM: length, waterplaneBeamM: beam } = vaka;
  const volumeM3 = massKg / SEA_WATER_KG_M3;
  return {
    areaM2: vaka.waterplaneAreaM2 ?? AREA_COEFFICIENT * length * beam,
    metacentricRadiusM: (INERTIA_COEFFICIENT * length * beam ** 3) / 12 / volumeM3,
  };
}
