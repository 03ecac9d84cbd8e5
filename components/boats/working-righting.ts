import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { GRAVITY_M_S2 } from '@/lib/units/constants';
import type { BoatFigures } from './boat-figures';
import { figure, kgM, newtonM, percent } from './show';
import type { WorkingStep } from './working';

const STATICS = 'statics; first moments of mass in the boat frame';

/** Righting moment by hand and the ama's load at rest. */
export function workingRighting({ sheet, sums, amaLoadKg }: BoatFigures): readonly WorkingStep[] {
  const momentNm = uprightRightingMomentNm(sums);
  const products = (height: 'yM' | 'zM') =>
    sheet.masses.map((mass) => `${figure(mass.kg, 1)} kg × ${figure(mass[height], 3)} m`).join(' + ');
  return [
    {
      what: 'Mass, M',
      equation: 'Σ m',
      numbers: sheet.masses.map(({ kg }) => `${figure(kg, 1)} kg`).join(' + '),
      result: `${figure(sums.massKg, 1)} kg`,
    },
    {
      what: 'Moment toward the ama, Sy',
      equation: 'Σ m · y, y from the vaka’s centreline toward the ama',
      numbers: products('yM'),
      result: `${figure(sums.momentYKgM, 1)} kg·m`,
      source: STATICS,
    },
    {
      what: 'Moment over the waterline, Sz',
      equation: 'Σ m · z, z up from the waterline',
      numbers: products('zM'),
      result: `${figure(sums.momentZKgM, 1)} kg·m`,
      source: STATICS,
    },
    {
      what: 'Righting moment by hand, RM0',
      equation: 'g · Sy',
      numbers: `${GRAVITY_M_S2} m/s² × ${figure(sums.momentYKgM, 1)} kg·m`,
      result: `${newtonM(momentNm)} (${kgM(momentNm)})`,
      source: 'the trade’s method by hand: lever upright, as the ama leaves the water. The real peak is lower.',
    },
    {
      what: 'Ama load at rest',
      equation: 'Sy ÷ B',
      numbers: `${figure(sums.momentYKgM, 1)} kg·m ÷ ${figure(sheet.spanM, 3)} m`,
      result: `${figure(amaLoadKg, 1)} kg, ${percent(amaLoadKg / sums.massKg)} of her mass`,
      source: 'statics of a beam on two floats',
    },
  ];
}
