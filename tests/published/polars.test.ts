import { describe, expect, it } from 'vitest';
import { bestAngleUp } from '@/lib/polars/best-angles';
import { polarSpeedKn } from '@/lib/polars/boat-speed';
import published from './polars.json';

const { polar, lookUps, bestUp } = published;

describe(`${lookUps.id} ${lookUps.title}: ${lookUps.source}`, () => {
  it.each(lookUps.rows)('$windKn kn at $angleDeg° gives $speedKn kn', ({ windKn, angleDeg, speedKn }) => {
    expect(Math.abs(polarSpeedKn(polar, windKn, angleDeg) - speedKn)).toBeLessThanOrEqual(lookUps.tolerance);
  });

  it(`is stricter than the source past the highest angle: ${lookUps.beyondHighestAngle.note}`, () => {
    const { windKn, angleDeg, sourceSpeedKn } = lookUps.beyondHighestAngle;
    expect(polarSpeedKn(polar, windKn, angleDeg)).toBe(0);
    expect(polarSpeedKn(polar, windKn, 170)).toBeCloseTo(sourceSpeedKn, 6);
  });
});

it(`${bestUp.id} ${bestUp.title}: ${bestUp.source}`, () => {
  const best = bestAngleUp(polar, bestUp.windKn);
  expect(Math.abs(best.angleDeg - bestUp.angleDeg)).toBeLessThan(bestUp.tolerance.angleDeg);
  expect(Math.abs(best.vmgKn - bestUp.vmgKn)).toBeLessThan(bestUp.tolerance.kn);
  expect(Math.abs(best.speedKn - bestUp.speedKn)).toBeLessThan(bestUp.tolerance.kn);
});
