import type { Craft, Reef } from '@/lib/rigging/craft';
import { pressureCoefficient, pressurePa } from '@/lib/rigging/pressure';
import { RAD_PER_DEG } from '@/lib/units/constants';
import type { Degrees, Knots, NewtonMetres } from '@/lib/units/quantities';

type Heeled = Pick<Craft, 'pressure' | 'centreOfLateralResistanceM'>;

/** HM0 = p·A·(zCE − zCLR), upright, in the apparent wind (the gust's for a gust). Source: docs/model.md §3. */
export function uprightHeelingMomentNm(craft: Heeled, reef: Reef, apparentWindKn: Knots): NewtonMetres {
  const leverM = reef.centreHeightM - craft.centreOfLateralResistanceM;
  return pressurePa(pressureCoefficient(craft.pressure), apparentWindKn) * reef.areaM2 * leverM;
}

/** HM(φ) = HM0·cos²φ. Source: 46 CFR 171.055, assumed heeling arm curves; the exponent from memory. */
export function heelingMomentNmAtHeel(uprightNm: NewtonMetres, heelDeg: Degrees): NewtonMetres {
  return uprightNm * Math.cos(heelDeg * RAD_PER_DEG) ** 2;
}
