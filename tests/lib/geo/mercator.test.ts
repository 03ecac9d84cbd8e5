import fc from 'fast-check';
import { expect, it } from 'vitest';
import { signedDeg } from '@/lib/geo/angles';
import { mercatorOffsetM } from '@/lib/geo/mercator';
import { rhumbInverse } from '@/lib/geo/rhumb';
import { directionOf, lengthOf } from '@/lib/geo/vector';

it('points along the rhumb line, and near the first place measures as it does', () => {
  fc.assert(
    fc.property(
      fc.double({ min: -70, max: 70, noNaN: true }),
      fc.double({ min: -180, max: 180, noNaN: true }),
      fc.double({ min: 0.001, max: 0.01, noNaN: true }),
      fc.double({ min: -0.01, max: 0.01, noNaN: true }),
      (lat, lon, north, east) => {
        const from = { lat, lon };
        const to = { lat: lat + north, lon: signedDeg(lon + east) };
        const offset = mercatorOffsetM(from, to);
        const { courseDeg, distanceM } = rhumbInverse(from, to);
        expect(Math.abs(signedDeg(directionOf(offset) - courseDeg))).toBeLessThan(1e-6);
        expect(Math.abs(lengthOf(offset) / distanceM - 1)).toBeLessThan(0.001);
      },
    ),
  );
});
