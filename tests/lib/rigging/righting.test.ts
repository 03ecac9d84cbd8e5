import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amaLoadAtRestKg } from '@/lib/rigging/ama-load';
import type { Mass } from '@/lib/rigging/craft';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';

const mass = fc.record({
  label: fc.constant('item'),
  kg: fc.double({ min: 0, max: 300, noNaN: true }),
  yM: fc.double({ min: -2, max: 5, noNaN: true }),
  zM: fc.double({ min: -1, max: 5, noNaN: true }),
});
const masses = fc.array(mass, { minLength: 1, maxLength: 12 });
const rightingOf = (items: readonly Mass[]) => uprightRightingMomentNm(sumMasses(items));

describe('righting moment by hand', () => {
  it('is nothing without masses', () => {
    expect(sumMasses([])).toEqual({ massKg: 0, momentYKgM: 0, momentZKgM: 0 });
  });

  it('never falls when crew move toward the ama', () => {
    fc.assert(
      fc.property(masses, mass, fc.double({ min: 0, max: 3, noNaN: true }), (others, crew, byM) => {
        const moved = { ...crew, yM: crew.yM + byM };
        expect(rightingOf([...others, moved])).toBeGreaterThanOrEqual(rightingOf([...others, crew]) - 1e-9);
      }),
    );
  });

  it('does not care for the order of the items', () => {
    fc.assert(
      fc.property(masses, (items) => {
        expect(rightingOf([...items].reverse())).toBeCloseTo(rightingOf(items), 6);
      }),
    );
  });

  it('puts a mass over the ama wholly on the ama', () => {
    const sums = sumMasses([{ label: 'crew', kg: 80, yM: 3, zM: 0.5 }]);
    expect(amaLoadAtRestKg(sums, 3)).toBeCloseTo(80, 9);
  });
});
