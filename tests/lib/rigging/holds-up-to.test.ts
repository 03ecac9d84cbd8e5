import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { HOLDS_UP_TO_CAP_KN, holdsUpToKn } from '@/lib/rigging/holds-up-to';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { buildCraft, buildReef } from '../../builders/craft';

const craft = buildCraft();
const reef = buildReef();
const angles = [55, 90, 120, 150];
/** Half the wind, at most 9 kn: slower in less wind, as boats are. */
const speedOf = (windKn: number) => Math.min(windKn / 2, 9);

describe('holds up to', () => {
  it('is the mean wind whose gust brings her to the righting moment with the working margin', () => {
    const { byAngle } = holdsUpToKn(craft, reef, speedOf, angles);
    const rightingNm = uprightRightingMomentNm(sumMasses(craft.masses));
    for (const { angleDeg, onCourseKn } of byAngle) {
      const gust = apparentWind(onCourseKn * craft.gustFactor, angleDeg, speedOf(onCourseKn));
      expect(craft.workingMargin * uprightHeelingMomentNm(craft, reef, gust.speedKn)).toBeCloseTo(rightingNm, 4);
    }
  });

  it('names the worst angle and its wind', () => {
    const { worstKn, worstAngleDeg, byAngle } = holdsUpToKn(craft, reef, speedOf, angles);
    expect(worstAngleDeg).toBe(55);
    expect(worstKn).toBe(Math.min(...byAngle.map((row) => row.kn)));
  });

  it('counts beam-on at rest over 120°, and not at 120°', () => {
    const { byAngle } = holdsUpToKn(craft, reef, speedOf, angles);
    const [, , at120, at150] = byAngle;
    const atRestKn = holdsUpToKn(craft, reef, () => 0, [90]).worstKn;
    expect(at120!.kn).toBe(at120!.onCourseKn);
    expect(at150!.onCourseKn).toBeGreaterThan(atRestKn);
    expect(at150!.kn).toBe(atRestKn);
  });

  it('takes the least wind that is too much where a faster boat would make a stronger one easier', () => {
    // At 150° she jumps from rest to 9 kn at 14 kn of wind, and outruns some of it.
    const jumps = (windKn: number) => (windKn < 14 ? 0 : 9);
    const still = holdsUpToKn(craft, reef, () => 0, [150]).byAngle[0]!;
    const limit = holdsUpToKn(craft, reef, jumps, [150]).byAngle[0]!;
    expect(still.onCourseKn).toBeLessThan(14);
    expect(limit.onCourseKn).toBeCloseTo(still.onCourseKn, 9);
  });

  it('stops at its cap, and is nothing where nothing rights her', () => {
    expect(holdsUpToKn(craft, buildReef({ areaM2: 0.2, centreHeightM: 0.1 }), () => 0, [90]).worstKn).toBe(
      HOLDS_UP_TO_CAP_KN,
    );
    const toLeeward = buildCraft({ masses: [{ label: 'crew', kg: 80, yM: -0.5, zM: 0.5 }] });
    expect(holdsUpToKn(toLeeward, reef, () => 0, [90]).worstKn).toBe(0);
  });

  it('wants an angle', () => {
    expect(() => holdsUpToKn(craft, reef, speedOf, [])).toThrow(RangeError);
  });

  it('never rises with more sail, more gust, more margin or crew moved inboard', () => {
    const factor = fc.double({ min: 1, max: 1.8, noNaN: true });
    fc.assert(
      fc.property(
        factor,
        factor,
        factor,
        fc.double({ min: 0, max: 1, noNaN: true }),
        (sail, gust, margin, inboardM) => {
          const worstOf = (changes: Parameters<typeof buildCraft>[0], areaM2: number) =>
            holdsUpToKn(buildCraft(changes), buildReef({ areaM2 }), speedOf, angles).worstKn;
          const base = worstOf({}, 15.2);
          const inboard = craft.masses.map((mass) =>
            mass.label === 'crew on the akas' ? { ...mass, yM: mass.yM - inboardM } : mass,
          );
          expect(worstOf({}, 15.2 * sail)).toBeLessThanOrEqual(base + 1e-9);
          expect(worstOf({ gustFactor: 1.35 * gust }, 15.2)).toBeLessThanOrEqual(base + 1e-9);
          expect(worstOf({ workingMargin: 1.5 * margin }, 15.2)).toBeLessThanOrEqual(base + 1e-9);
          expect(worstOf({ masses: inboard }, 15.2)).toBeLessThanOrEqual(base + 1e-9);
        },
      ),
      { numRuns: 30 },
    );
  });
});
