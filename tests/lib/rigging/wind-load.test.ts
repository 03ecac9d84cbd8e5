import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { abackLimitKn, abackRightingMomentNm } from '@/lib/rigging/aback';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import { heelingMomentNmAtHeel, uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { pressureCoefficient, pressurePa } from '@/lib/rigging/pressure';
import { buildCraft, buildReef, without } from '../../builders/craft';

const craft = buildCraft();
const reef = buildReef();
const gusts = fc.double({ min: 1, max: 60, noNaN: true });

describe('apparent wind', () => {
  it('keeps the side of the wind', () => {
    expect(apparentWind(10, -90, 10).angleDeg).toBeCloseTo(-45, 9);
    expect(apparentWind(10, 90, 10).angleDeg).toBeCloseTo(45, 9);
  });

  it('is her own way in a calm', () => {
    expect(apparentWind(0, 90, 6)).toEqual({ speedKn: 6, angleDeg: 0 });
  });

  it('comes from further aft and, while she is not faster than it, stronger, the more it gusts', () => {
    fc.assert(
      fc.property(
        gusts,
        fc.double({ min: 0, max: 20, noNaN: true }),
        fc.double({ min: 0, max: 180, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (gustKn, moreKn, angleDeg, shareOfGust) => {
          const boatKn = gustKn * shareOfGust;
          const less = apparentWind(gustKn, angleDeg, boatKn);
          const more = apparentWind(gustKn + moreKn, angleDeg, boatKn);
          expect(more.speedKn).toBeGreaterThanOrEqual(less.speedKn - 1e-9);
          if (less.speedKn > 1e-6) expect(more.angleDeg).toBeGreaterThanOrEqual(less.angleDeg - 1e-6);
          expect(uprightHeelingMomentNm(craft, reef, more.speedKn)).toBeGreaterThanOrEqual(
            uprightHeelingMomentNm(craft, reef, less.speedKn) - 1e-6,
          );
        },
      ),
      { numRuns: 500 },
    );
  });
});

describe('pressure and heeling moment', () => {
  it('gives the rule back at its own wind', () => {
    const coefficient = pressureCoefficient({ kgPerM2: 10, atKn: 18 });
    expect(pressurePa(coefficient, 18) / 9.80665).toBeCloseTo(10, 9);
    expect(pressureCoefficient({ coefficient: 1.4 })).toBe(1.4);
  });

  it('goes with the square of the wind, with the area and with the lever from the centre of lateral resistance', () => {
    const once = uprightHeelingMomentNm(craft, reef, 10);
    expect(uprightHeelingMomentNm(craft, reef, 20)).toBeCloseTo(4 * once, 6);
    expect(uprightHeelingMomentNm(craft, buildReef({ areaM2: 7.6 }), 10)).toBeCloseTo(once / 2, 6);
    const fromWaterline = { ...craft, centreOfLateralResistanceM: 0 };
    expect(uprightHeelingMomentNm(fromWaterline, reef, 10)).toBeCloseTo((once * 3) / 3.45, 6);
  });

  it('falls with the square of the cosine of the heel', () => {
    expect(heelingMomentNmAtHeel(1000, 0)).toBe(1000);
    expect(heelingMomentNmAtHeel(1000, 60)).toBeCloseTo(250, 9);
    expect(heelingMomentNmAtHeel(1000, 90)).toBeCloseTo(0, 9);
  });
});

describe('aback', () => {
  it('is not known without the volume of the ama', () => {
    expect(abackRightingMomentNm(without(craft, 'ama'))).toBeNull();
    expect(abackLimitKn(buildCraft({ ama: { waterplaneM2: 1 } }), reef)).toBeNull();
  });

  it('has no reserve where the ama cannot carry what is on it', () => {
    const heavy = buildCraft({ ama: { volumeL: 60 } });
    expect(abackRightingMomentNm(heavy)).toBeLessThan(0);
    expect(abackLimitKn(heavy, reef)).toBe(0);
  });

  it('is the wind whose moment at rest is the righting moment aback', () => {
    const limitKn = abackLimitKn(craft, reef)!;
    expect(uprightHeelingMomentNm(craft, reef, limitKn)).toBeCloseTo(abackRightingMomentNm(craft)!, 6);
  });

  it('is worse with crew on the ama, and better with less sail', () => {
    const crewOut = buildCraft({ masses: [...craft.masses, { label: 'crew', kg: 30, yM: 2.9, zM: 0.5 }] });
    expect(abackLimitKn(crewOut, reef)!).toBeLessThan(abackLimitKn(craft, reef)!);
    expect(abackLimitKn(craft, buildReef({ areaM2: 6 }))!).toBeGreaterThan(abackLimitKn(craft, reef)!);
  });
});
