import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { equilibriumHeel } from '@/lib/rigging/equilibrium-heel';
import { heelingMomentNmAtHeel } from '@/lib/rigging/heeling-moment';
import { rightingCurve } from '@/lib/rigging/righting-curve';
import { buildCraft, without } from '../../builders/craft';

const curve = rightingCurve(buildCraft())!;
const bare = rightingCurve(without(buildCraft(), 'pod'))!;

describe('equilibrium heel', () => {
  it('balances, and no smaller heel does', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 9000, noNaN: true }), (uprightNm) => {
        const surplus = (heel: number) => curve.momentNmAt(heel) - heelingMomentNmAtHeel(uprightNm, heel);
        const balance = equilibriumHeel(curve, uprightNm);
        const end = balance ? balance.heelDeg : 90;
        if (balance) {
          expect(Math.abs(surplus(balance.heelDeg))).toBeLessThan(0.001);
          expect(balance.pastLiftOff).toBe(balance.heelDeg > curve.liftOffDeg);
        }
        let largestBefore = -Infinity;
        for (let heel = 0; heel < end - 1e-6; heel += 0.05) largestBefore = Math.max(largestBefore, surplus(heel));
        expect(largestBefore).toBeLessThan(0);
      }),
      { numRuns: 60 },
    );
  });

  it('lies upright without wind', () => {
    expect(equilibriumHeel(curve, 0)).toEqual({ heelDeg: 0, pastLiftOff: false });
  });

  it('holds at lift-off itself with the ama on the water', () => {
    const atPeak = curve.liftOffMomentNm / Math.cos((curve.liftOffDeg * Math.PI) / 180) ** 2;
    const balance = equilibriumHeel(curve, atPeak * (1 - 1e-9))!;
    expect(balance.heelDeg).toBeCloseTo(curve.liftOffDeg, 4);
    expect(balance.pastLiftOff).toBe(false);
  });

  it('still returns a balance that only the pod gives, marked past lift-off', () => {
    const balance = equilibriumHeel(curve, 3300)!;
    expect(balance.pastLiftOff).toBe(true);
    expect(balance.heelDeg).toBeGreaterThan(curve.touchdownDeg!);
    expect(curve.podImmersionMAt(balance.heelDeg)).toBeGreaterThan(0);
  });

  it('has none where the moment outgrows the curve', () => {
    expect(equilibriumHeel(bare, 4000)).toBeNull();
    expect(equilibriumHeel(curve, 50_000)).toBeNull();
  });

  it('finds the touch of a hill that is far narrower than its steps', () => {
    // A made-up curve that rights enough only within 0.02° of 33.337°.
    const spike = (heel: number) => Math.max(0, 1 - Math.abs(heel - 33.337) / 5) ** 8 * 1000;
    const top = 1000 / Math.cos((33.337 * Math.PI) / 180) ** 2;
    const balance = equilibriumHeel({ liftOffDeg: 2, momentNmAt: spike }, top * 0.9999);
    expect(balance).not.toBeNull();
    expect(Math.abs(balance!.heelDeg - 33.337)).toBeLessThan(0.02);
  });

  it('heels more in more wind', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: 0, max: 200, noNaN: true }),
        (uprightNm, more) => {
          const less = equilibriumHeel(curve, uprightNm)!;
          const greater = equilibriumHeel(curve, uprightNm + more)!;
          expect(greater.heelDeg).toBeGreaterThanOrEqual(less.heelDeg - 1e-9);
        },
      ),
    );
  });
});
