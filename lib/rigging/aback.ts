import type { Craft, Reef } from '@/lib/rigging/craft';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { GRAVITY_M_S2, SEA_WATER_KG_M3 } from '@/lib/units/constants';
import type { Knots, NewtonMetres } from '@/lib/units/quantities';

const LITRES_PER_M3 = 1000;

/**
 * Righting moment with the wind on the wrong side and the ama pressed down, RMa = g·(ρw·Vama·B − Sy).
 * Null where the ama's volume is not known; zero or less says that she has no reserve aback. Source: docs/model.md §2.
 */
export function abackRightingMomentNm(craft: Craft): NewtonMetres | null {
  const volumeL = craft.ama?.volumeL;
  if (volumeL === undefined) return null;
  const amaLiftKg = (SEA_WATER_KG_M3 * volumeL) / LITRES_PER_M3;
  return GRAVITY_M_S2 * (amaLiftKg * craft.spanM - sumMasses(craft.masses).momentYKgM);
}

/**
 * Aback limit of a reef: the gust over the water, beam-on, at rest, at which HM0 = RMa, without a working margin.
 * 0 where she has no reserve aback; null where the ama's volume is not known. Source: docs/model.md §2.
 */
export function abackLimitKn(craft: Craft, reef: Reef): Knots | null {
  const rightingNm = abackRightingMomentNm(craft);
  if (rightingNm === null) return null;
  if (rightingNm <= 0) return 0;
  // The moment goes with the square of the wind, so one knot's moment gives the wind of any other.
  return Math.sqrt(rightingNm / uprightHeelingMomentNm(craft, reef, 1));
}
