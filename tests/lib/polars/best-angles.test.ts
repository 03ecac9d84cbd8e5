import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bestAngleDown, bestAngleUp } from '@/lib/polars/best-angles';
import { polarSpeedKn } from '@/lib/polars/boat-speed';
import type { Polar } from '@/lib/polars/polar';

const anglesDeg = [50, 60, 80, 110, 140, 165];
const polars = fc
  .array(fc.array(fc.double({ min: 0.5, max: 12, noNaN: true }), { minLength: 6, maxLength: 6 }), {
    minLength: 2,
    maxLength: 2,
  })
  .map((speedsKn): Polar => ({ windSpeedsKn: [6, 14], windAnglesDeg: anglesDeg, speedsKn }));
const winds = fc.double({ min: 1, max: 20, noNaN: true });
const cosine = (deg: number) => Math.cos((deg * Math.PI) / 180);

describe('best angles', () => {
  it('beat every angle tried one by one, up and down the wind', () => {
    fc.assert(
      fc.property(polars, winds, (polar, windKn) => {
        const up = bestAngleUp(polar, windKn);
        const down = bestAngleDown(polar, windKn);
        let triedUpKn = -Infinity;
        let triedDownKn = -Infinity;
        for (let deg = 50; deg <= 150; deg += 0.5) {
          const towardKn = polarSpeedKn(polar, windKn, deg) * cosine(deg);
          if (deg <= 90) triedUpKn = Math.max(triedUpKn, towardKn);
          else triedDownKn = Math.max(triedDownKn, -towardKn);
        }
        expect(up.vmgKn).toBeGreaterThanOrEqual(triedUpKn - 1e-9);
        expect(down.vmgKn).toBeGreaterThanOrEqual(triedDownKn - 1e-9);
        expect(up.speedKn).toBeCloseTo(polarSpeedKn(polar, windKn, up.angleDeg), 9);
        expect(down.angleDeg).toBeLessThanOrEqual(150);
      }),
    );
  });

  it('finds an angle between the rows, not the nearest row', () => {
    const polar: Polar = { windSpeedsKn: [10], windAnglesDeg: [40, 80], speedsKn: [[2, 8]] };
    const { angleDeg } = bestAngleUp(polar, 10);
    // Where d/dθ of (a + bθ)·cosθ is zero: tanθ = b / (a + bθ), b in knots a radian.
    const perRadian = (6 / 40) * (180 / Math.PI);
    expect(Math.tan((angleDeg * Math.PI) / 180)).toBeCloseTo(perRadian / polarSpeedKn(polar, 10, angleDeg), 4);
    expect(angleDeg).toBeGreaterThan(41);
    expect(angleDeg).toBeLessThan(79);
  });

  it('goes no deeper than asked', () => {
    const polar: Polar = { windSpeedsKn: [10], windAnglesDeg: [60, 170], speedsKn: [[5, 5]] };
    expect(bestAngleDown(polar, 10).angleDeg).toBeCloseTo(150, 9);
    expect(bestAngleDown(polar, 10, 165).angleDeg).toBeCloseTo(165, 9);
  });

  it('keeps the angle of the lowest wind under it, down to a calm', () => {
    const polar: Polar = { windSpeedsKn: [8], windAnglesDeg: [40, 80], speedsKn: [[2, 8]] };
    const calm = bestAngleUp(polar, 0);
    expect(calm.angleDeg).toBeCloseTo(bestAngleUp(polar, 8).angleDeg, 4);
    expect(calm.vmgKn).toBe(0);
  });
});
