import { describe, expect, it } from 'vitest';
import { abackRightingMomentNm } from '@/lib/rigging/aback';
import { amaLoadAtRestKg } from '@/lib/rigging/ama-load';
import { holdsUpToKn } from '@/lib/rigging/holds-up-to';
import { rightingCurve } from '@/lib/rigging/righting-curve';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { vakaWaterplane } from '@/lib/rigging/vaka-waterplane';
import { buildCraft, buildReef } from '../builders/craft';
import published from './worked-examples.json';

type Pair = [number, number];
type Triple = [number, number, number];

describe(`A. ${published.byHand.title}: ${published.source}`, () => {
  const { placings, tolerance } = published.byHand;

  it.each(placings)('$name', ({ masses, rightingNm, lifts }) => {
    const craft = buildCraft({
      masses: (masses as [string, number, number][]).map(([label, kg, yM]) => ({ label, kg, yM, zM: 0 })),
      pressure: { coefficient: 1.2 },
      centreOfLateralResistanceM: 0,
      gustFactor: 1,
      workingMargin: 1,
    });
    expect(Math.abs(uprightRightingMomentNm(sumMasses(craft.masses)) - rightingNm)).toBeLessThan(tolerance.newtonM);
    for (const [areaM2, centreHeightM, kn] of lifts as Triple[]) {
      const { worstKn } = holdsUpToKn(craft, buildReef({ areaM2, centreHeightM }), () => 0, [90]);
      expect(Math.abs(worstKn - kn)).toBeLessThan(tolerance.kn);
    }
  });
});

describe(`B. The righting curve: ${published.source}`, () => {
  const b = published.curve;
  const craft = buildCraft({
    spanM: b.spanM,
    masses: (b.masses as Triple[]).map(([kg, yM, zM], index) => ({ label: `item ${index + 1}`, kg, yM, zM })),
    vaka: b.vaka,
    ama: b.ama,
    pod: b.pod,
  });
  const sums = sumMasses(craft.masses);
  const curve = rightingCurve(craft)!;

  it('sums the masses', () => {
    expect(sums.massKg).toBeCloseTo(b.massKg, 6);
    expect(sums.momentYKgM).toBeCloseTo(b.momentYKgM, 6);
    expect(sums.momentZKgM).toBeCloseTo(b.momentZKgM, 6);
    expect(uprightRightingMomentNm(sums)).toBeCloseTo(b.uprightNm, 1);
    expect(amaLoadAtRestKg(sums, b.spanM)).toBeCloseTo(b.amaLoadKg, 2);
    expect(amaLoadAtRestKg(sums, b.spanM) / sums.massKg).toBeCloseTo(b.amaLoadShare, 3);
  });

  it('finds lift-off, sinkage and metacentre', () => {
    expect(curve.amaImmersionAtRestM).toBeCloseTo(b.amaImmersionM, 4);
    expect(curve.liftOffDeg).toBeCloseTo(b.liftOffDeg, 3);
    expect(curve.liftOffMomentNm).toBeCloseTo(b.liftOffNm, 1);
    expect(curve.metacentricRadiusM).toBeCloseTo(b.metacentricRadiusM, 4);
    expect(vakaWaterplane(craft.vaka!, sums.massKg).areaM2).toBeCloseTo(b.waterplaneM2, 3);
    expect(curve.sinkageAtLiftOffM).toBeCloseTo(b.sinkageM, 4);
  });

  it('finds touchdown, the vanishing angle and the moment aback', () => {
    expect(curve.touchdownDeg).toBeCloseTo(b.touchdownDeg, 2);
    expect(Math.abs(curve.vanishingDeg! - b.vanishingDeg)).toBeLessThan(0.01);
    expect(abackRightingMomentNm(craft)).toBeCloseTo(b.abackNm, 1);
  });

  it.each(b.moments as Pair[])('rights at %d° with %d N·m', (heelDeg, newtonM) => {
    expect(Math.abs(curve.momentNmAt(heelDeg) - newtonM)).toBeLessThan(0.01);
  });

  it.each(b.podImmersions as Pair[])('has its pod at %d° by %d m in the water', (heelDeg, metres) => {
    expect(Math.abs(curve.podImmersionMAt(heelDeg) - metres)).toBeLessThan(0.0001);
  });

  it.each(b.amaHeights as Pair[])('flies its ama at %d° by %d m', (heelDeg, metres) => {
    expect(Math.abs(curve.amaHeightMAt(heelDeg) - metres)).toBeLessThan(0.001);
  });
});
