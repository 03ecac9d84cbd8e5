import { describe, expect, it } from 'vitest';
import { momentAfterLiftOffNm } from '@/lib/rigging/moment-after-lift-off';
import { rightingCurve } from '@/lib/rigging/righting-curve';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { buildCraft, without } from '../builders/craft';
import published from './righting-moments.json';

describe(`righting moments with z from the metacentre: ${published.cases[0]!.source}`, () => {
  it.each(published.cases)('$id $title: sums and moments by heel', (row) => {
    const sums = sumMasses(row.masses);
    expect(sums.massKg).toBeCloseTo(row.massKg, 6);
    expect(Math.abs(sums.momentYKgM / sums.massKg - row.centreYM)).toBeLessThan(row.tolerance.centreM);
    expect(Math.abs(sums.momentZKgM / sums.massKg - row.centreZM)).toBeLessThan(row.tolerance.centreM);
    expect(Math.abs(uprightRightingMomentNm(sums) - row.moments[0]!.newtonM)).toBeLessThan(row.tolerance.newtonM);
    for (const { heelDeg, newtonM } of row.moments) {
      expect(Math.abs(momentAfterLiftOffNm(sums, heelDeg, 0) - newtonM)).toBeLessThan(row.tolerance.newtonM);
    }
  });

  it.each(published.cases)('$id $title: the curve and its vanishing angle', (row) => {
    // The metacentre on the waterline: a centre of buoyancy at zero and next to no beam. Vast waterplanes: no sinkage.
    const craft = buildCraft({
      masses: row.masses,
      vaka: { waterplaneLengthM: 1, waterplaneBeamM: 1e-4, waterplaneAreaM2: 1e9, buoyancyHeightM: 0 },
      ama: { waterplaneM2: 1e9 },
    });
    const curve = rightingCurve(without(craft, 'pod'))!;
    expect(Math.abs(curve.vanishingDeg! - row.vanishingDeg)).toBeLessThan(row.tolerance.vanishingDeg);
    for (const { heelDeg, newtonM } of row.moments.filter((moment) => moment.heelDeg > 0)) {
      expect(Math.abs(curve.momentNmAt(heelDeg) - newtonM)).toBeLessThan(row.tolerance.newtonM);
    }
  });
});
