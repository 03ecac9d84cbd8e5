import { describe, expect, it } from 'vitest';
import { signedDeg } from '@/lib/geo/angles';
import { NO_VECTOR, vectorToward } from '@/lib/geo/vector';
import { windOverWater } from '@/lib/passages/wind-over-water';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import { pressurePa } from '@/lib/rigging/pressure';
import { GRAVITY_M_S2 } from '@/lib/units/constants';
import { beaufortForce } from '@/lib/weather/beaufort';
import { buildCraft, buildReef } from '../builders/craft';
import published from './wind.json';

describe(`${published.beaufort.title}: ${published.beaufort.source}`, () => {
  it.each(published.beaufort.kn.map((kn, index) => ({ kn, force: published.beaufort.force[index]! })))(
    '$kn kn is force $force',
    ({ kn, force }) => {
      expect(beaufortForce(kn)).toBe(force);
    },
  );
});

it(`${published.dynamicPressure.title} (${published.dynamicPressure.provenance})`, () => {
  const { kn, pascals, kgfPerM2, tolerance } = published.dynamicPressure;
  expect(Math.abs(pressurePa(1, kn) - pascals)).toBeLessThan(tolerance.pascals);
  expect(Math.abs(pressurePa(1, kn) / GRAVITY_M_S2 - kgfPerM2)).toBeLessThan(tolerance.kgfPerM2);
});

it(`${published.heightProfile.title}: ${published.heightProfile.source}`, () => {
  const { meanKn, heightM, exponent, expectedKn, tolerance } = published.heightProfile;
  const conditions = { wind: { fromDeg: 200, meanKn, gustKn: meanKn }, streamKn: NO_VECTOR };
  const craft = buildCraft({ windHeightExponent: exponent });
  const wind = windOverWater(conditions, buildReef({ centreHeightM: heightM }), craft);
  expect(Math.abs(wind.meanKn - expectedKn)).toBeLessThan(tolerance);
});

describe('true and apparent wind from a moving ship', () => {
  it.each(published.fromShip)('$id $title: $source ($provenance)', (row) => {
    const { courseDeg, speedKn, apparent, trueWind, tolerance } = row;

    // The air of the ship's own way is taken off as a stream that runs against her would be.
    const conditions = {
      wind: { fromDeg: apparent.fromDeg, meanKn: apparent.kn, gustKn: apparent.kn },
      streamKn: vectorToward(courseDeg + 180, speedKn),
    };
    const found = windOverWater(conditions, buildReef(), buildCraft());
    expect(Math.abs(signedDeg(found.fromDeg - trueWind.fromDeg))).toBeLessThan(tolerance.fromDeg);
    expect(Math.abs(found.meanKn - trueWind.kn)).toBeLessThan(tolerance.kn);

    const back = apparentWind(trueWind.kn, signedDeg(trueWind.fromDeg - courseDeg), speedKn);
    expect(Math.abs(signedDeg(back.angleDeg - (apparent.fromDeg - courseDeg)))).toBeLessThan(tolerance.fromDeg);
    expect(Math.abs(back.speedKn - apparent.kn)).toBeLessThan(tolerance.kn);
  });

  it(`${published.apparent.title}: ${published.apparent.source}`, () => {
    const { twsKn, twaDeg, boatKn, speedKn, angleDeg, tolerance } = published.apparent;
    const found = apparentWind(twsKn, twaDeg, boatKn);
    expect(Math.abs(found.speedKn - speedKn)).toBeLessThan(tolerance);
    expect(Math.abs(found.angleDeg - angleDeg)).toBeLessThan(tolerance);
  });
});
