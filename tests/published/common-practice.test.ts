import { describe, expect, it } from 'vitest';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { holdsUpToKn } from '@/lib/rigging/holds-up-to';
import { pointHeightOverWaterM } from '@/lib/rigging/point-height';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { GRAVITY_M_S2 } from '@/lib/units/constants';
import { buildCraft, buildReef } from '../builders/craft';

/** Common practice, no source. */
describe('rules of the shed (common practice, no source)', () => {
  const AT_KN = 18;
  const craft = buildCraft({
    masses: [{ label: 'all to windward', kg: 200, yM: 3, zM: 0.3 }],
    pressure: { kgPerM2: 10, atKn: AT_KN },
    centreOfLateralResistanceM: 0,
    gustFactor: 1,
    workingMargin: 1,
  });
  const rightingKgM = uprightRightingMomentNm(sumMasses(craft.masses)) / GRAVITY_M_S2;
  const full = buildReef({ areaM2: 20, centreHeightM: 4.75 });
  const first = buildReef({ name: 'first', areaM2: 14.75, centreHeightM: 4 });
  const heelingKgM = (reef: typeof full) => uprightHeelingMomentNm(craft, reef, AT_KN) / GRAVITY_M_S2;
  const holdsKn = (reef: typeof full, workingMargin: number) =>
    holdsUpToKn({ ...craft, workingMargin }, reef, () => 0, [90]).worstKn;

  it('10 kg/m² at 18 kn on 20 m² with a lever of 4.75 m heels with 950 kg·m', () => {
    expect(heelingKgM(full)).toBeCloseTo(950, 6);
  });

  it('a craft that holds 600 kg·m must reef by then', () => {
    expect(rightingKgM).toBeCloseTo(600, 6);
    expect(holdsKn(full, 1)).toBeLessThan(AT_KN);
  });

  it('with the first reef at 590 kg·m she is just within 600, and not at any margin over 1.02', () => {
    expect(heelingKgM(first)).toBeCloseTo(590, 6);
    expect(holdsKn(first, 1)).toBeGreaterThan(AT_KN);
    expect(holdsKn(first, 1.01)).toBeGreaterThan(AT_KN);
    expect(holdsKn(first, 1.02)).toBeLessThan(AT_KN);
  });

  it('hulls 3 m apart at 18° and 0.10 m of rise: 0.83 m, off a scale drawing 0.85 m', () => {
    const heightM = pointHeightOverWaterM(3, 18, 0.1);
    expect(Math.abs(heightM - 0.83)).toBeLessThan(0.005);
    expect(Math.abs(heightM - 0.85)).toBeLessThan(0.05);
  });
});
