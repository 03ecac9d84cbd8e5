import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rightingCurve } from '@/lib/rigging/righting-curve';
import { buildCraft, without } from '../../builders/craft';

const craft = buildCraft();

describe('righting curve', () => {
  it('is absent without the measures it needs', () => {
    expect(rightingCurve(without(craft, 'vaka'))).toBeNull();
    expect(rightingCurve(without(craft, 'ama'))).toBeNull();
    expect(rightingCurve(buildCraft({ ama: { volumeL: 180 } }))).toBeNull();
    expect(rightingCurve(buildCraft({ masses: [{ label: 'rig', kg: 40, yM: -0.1, zM: 2 }] }))).toBeNull();
  });

  it('starts at nothing, rises straight to lift-off and has no jump there', () => {
    const curve = rightingCurve(craft)!;
    expect(curve.momentNmAt(0)).toBe(0);
    expect(curve.momentNmAt(curve.liftOffDeg / 2)).toBeCloseTo(curve.liftOffMomentNm / 2, 6);
    expect(curve.momentNmAt(curve.liftOffDeg - 1e-9)).toBeCloseTo(curve.momentNmAt(curve.liftOffDeg + 1e-9), 3);
  });

  it('has the ama at its depth at rest, and on the water at lift-off', () => {
    const curve = rightingCurve(craft)!;
    expect(curve.amaHeightMAt(0)).toBeCloseTo(-curve.amaImmersionAtRestM, 9);
    expect(curve.amaHeightMAt(curve.liftOffDeg)).toBeCloseTo(0, 9);
  });

  it('falls from lift-off until the pod touches, and the pod only adds', () => {
    const curve = rightingCurve(craft)!;
    const bare = rightingCurve(without(craft, 'pod'))!;
    for (let heel = curve.liftOffDeg; heel + 0.5 < curve.touchdownDeg!; heel += 0.5) {
      expect(curve.momentNmAt(heel + 0.5)).toBeLessThan(curve.momentNmAt(heel));
      expect(curve.podImmersionMAt(heel)).toBe(0);
    }
    for (let heel = 0; heel <= 90; heel += 1) {
      expect(curve.momentNmAt(heel)).toBeGreaterThanOrEqual(bare.momentNmAt(heel) - 1e-9);
    }
    expect(curve.podImmersionMAt(curve.touchdownDeg! + 0.1)).toBeGreaterThan(0);
    expect(curve.podImmersionMAt(80)).toBe(craft.pod!.depthM);
    expect(curve.vanishingDeg!).toBeGreaterThan(bare.vanishingDeg!);
  });

  it('says that there is no touchdown without a pod', () => {
    const bare = rightingCurve(without(craft, 'pod'))!;
    expect(bare.touchdownDeg).toBeNull();
    expect(bare.podImmersionMAt(40)).toBe(0);
  });

  it('takes the first heel at which nothing rights her, not a later one past the pod', () => {
    const topHeavy = buildCraft({
      masses: [...craft.masses, { label: 'mast', kg: 60, yM: 0, zM: 12 }],
      pod: { lengthM: 6, breadthM: 1, depthM: 0.8, offsetM: 1.5, bottomHeightM: 1.2 },
    });
    const curve = rightingCurve(topHeavy)!;
    expect(curve.momentNmAt(curve.vanishingDeg!)).toBeCloseTo(0, 6);
    expect(curve.vanishingDeg!).toBeLessThan(curve.touchdownDeg!);
    expect(curve.momentNmAt(60)).toBeGreaterThan(0);
  });

  it('has no vanishing angle where she rights herself all the way to 90°', () => {
    const keeled = buildCraft({ masses: [...craft.masses, { label: 'lead', kg: 200, yM: 0, zM: -2 }] });
    expect(rightingCurve(keeled)!.vanishingDeg).toBeNull();
  });

  it('vanishes at lift-off where the masses are so high that nothing rights her even there', () => {
    const hopeless = rightingCurve(
      without(
        buildCraft({ masses: [{ label: 'mast', kg: 100, yM: 0.2, zM: 14 }], ama: { waterplaneM2: 0.05 } }),
        'pod',
      ),
    )!;
    expect(hopeless.liftOffMomentNm).toBeLessThan(0);
    expect(hopeless.vanishingDeg).toBe(hopeless.liftOffDeg);
  });

  it('flies the ama no lower, and lifts it no later, the larger its waterplane', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.2, max: 3, noNaN: true }),
        fc.double({ min: 6, max: 60, noNaN: true }),
        (area, heel) => {
          const small = rightingCurve(buildCraft({ ama: { waterplaneM2: area } }))!;
          const large = rightingCurve(buildCraft({ ama: { waterplaneM2: area * 1.2 } }))!;
          expect(large.amaHeightMAt(heel)).toBeGreaterThanOrEqual(small.amaHeightMAt(heel));
          expect(large.liftOffDeg).toBeLessThanOrEqual(small.liftOffDeg);
        },
      ),
    );
  });
});
