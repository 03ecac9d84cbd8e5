import { describe, expect, it } from 'vitest';
import { polarSpeedKn } from '@/lib/polars/boat-speed';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import type { Mass } from '@/lib/rigging/craft';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { holdsUpToKn } from '@/lib/rigging/holds-up-to';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { buildCraft } from '../builders/craft';
import published from './reef-limits.json';

const { reefs, polar } = published;
const craftWith = (masses: readonly Mass[], gustFactor = 1.23) =>
  buildCraft({
    masses,
    pressure: { coefficient: 1.2 },
    centreOfLateralResistanceM: -0.25,
    gustFactor,
    workingMargin: 1.5,
    reefs,
  });
const speedOf = (windKn: number, angleDeg: number) => polarSpeedKn(polar, windKn, angleDeg);

describe(`limits of a reef table (${published.conventions}): ${published.trueLimits.source}`, () => {
  it.each(reefs.map((reef, index) => ({ ...reef, kn: published.apparentLimits.kn[index]! })))(
    `${published.apparentLimits.id} apparent wind: $name hold to $kn kn`,
    (row) => {
      const { worstKn } = holdsUpToKn(craftWith(published.massesCrewIn, 1), row, () => 0, [90]);
      expect(Math.abs(worstKn - row.kn)).toBeLessThan(published.apparentLimits.tolerance);
    },
  );

  it.each(reefs.map((reef, index) => ({ ...reef, limits: published.trueLimits.kn[index]! })))(
    `${published.trueLimits.id} mean true wind on the course: $name hold to $limits kn`,
    (row) => {
      const { anglesDeg, tolerance } = published.trueLimits;
      const { byAngle } = holdsUpToKn(craftWith(published.massesCrewIn), row, speedOf, anglesDeg);
      byAngle.forEach(({ onCourseKn }, index) => {
        expect(Math.abs(onCourseKn - row.limits[index]!)).toBeLessThan(tolerance);
      });
    },
  );

  it(`${published.leg.id} ${published.leg.title}`, () => {
    const { leg } = published;
    const craft = craftWith(published.massesCrewOut);
    const boatKn = speedOf(leg.twsKn, leg.twaDeg);
    const gust = apparentWind(leg.twsKn * craft.gustFactor, leg.twaDeg, boatKn);
    expect(Math.abs(gust.speedKn - leg.apparentGustKn)).toBeLessThan(leg.tolerance.other);
    expect(Math.abs(gust.angleDeg - leg.apparentAngleDeg)).toBeLessThan(leg.tolerance.other);

    const rightingNm = uprightRightingMomentNm(sumMasses(craft.masses));
    reefs.forEach((reef, index) => {
      const heelingNm = uprightHeelingMomentNm(craft, reef, gust.speedKn);
      const ratio = rightingNm / (craft.workingMargin * heelingNm);
      expect(Math.abs(heelingNm - leg.heelingNm[index]!)).toBeLessThan(leg.tolerance.newtonM);
      expect(Math.abs(ratio - leg.rightingOverHeelingWithMargin[index]!)).toBeLessThan(leg.tolerance.ratio);
    });
    const holds = reefs.map((reef) => holdsUpToKn(craft, reef, speedOf, [leg.twaDeg]).worstKn);
    expect(holds.findIndex((kn) => kn >= leg.twsKn)).toBe(leg.firstThatServes);
  });
});
