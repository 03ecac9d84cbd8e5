import { polarSpeedKn } from '@/lib/polars/boat-speed';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import { HOLDS_UP_TO_CAP_KN } from '@/lib/rigging/holds-up-to';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import type { BoatFigures, ReefFigures } from './boat-figures';
import { figure, limitKn, newtonM } from './show';
import type { WorkingStep } from './working';
import { workingHeeling } from './working-heeling';

/** Holds up to, put back into the equation that it solves, at its worst wind angle. */
export function workingHolds({ sheet, sums }: BoatFigures, { reef, holds }: ReefFigures): readonly WorkingStep[] {
  const { worstKn, worstAngleDeg } = holds;
  const worst = holds.byAngle.find(({ angleDeg }) => angleDeg === worstAngleDeg);
  const atRest = worst !== undefined && worst.kn < worst.onCourseKn;
  const gustKn = worstKn * sheet.gustFactor;
  const boatKn = atRest ? 0 : polarSpeedKn(sheet.polar, worstKn, worstAngleDeg) * reef.speedFactor;
  const angleDeg = atRest ? 90 : worstAngleDeg;
  const apparentKn = apparentWind(gustKn, angleDeg, boatKn).speedKn;
  const rightingNm = uprightRightingMomentNm(sums);
  const heelingNm = uprightHeelingMomentNm(sheet, reef, apparentKn);
  const where = atRest
    ? `sailing at ${figure(worstAngleDeg)}°, where a shunt or a round-up leaves her beam-on with no way on`
    : `at ${figure(worstAngleDeg)}° off the wind`;
  return [
    {
      what: `Apparent wind in the gust, ${where}`,
      equation: 'Va = √((G · cos θ + v)² + (G · sin θ)²), G the gust, v her speed in the mean wind',
      numbers: `gust ${figure(worstKn, 2)} kn × ${figure(sheet.gustFactor, 2)} = ${figure(gustKn, 2)} kn, θ = ${figure(angleDeg)}°, v = ${figure(boatKn, 2)} kn`,
      result: `${figure(apparentKn, 2)} kn`,
      source: 'the wind triangle, The American Practical Navigator (Pub. No. 9)',
    },
    ...workingHeeling(sheet, reef, apparentKn),
    {
      what: 'Balance with the working margin',
      equation: worstKn < HOLDS_UP_TO_CAP_KN ? 'k · HM0 = RM0' : `k · HM0 is still under RM0 at ${limitKn(worstKn)}`,
      numbers: `${figure(sheet.workingMargin, 2)} × ${newtonM(heelingNm)} = ${newtonM(sheet.workingMargin * heelingNm)} against ${newtonM(rightingNm)}`,
      result: `holds up to ${limitKn(worstKn)} mean (cut, not rounded up), wind over the water at the centre of effort`,
      source: 'working margin of the owner; leeway and stream are left out',
    },
  ];
}
