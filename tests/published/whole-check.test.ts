import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { check, completeRequest } from '../builders/check-request';

/**
 * Source: check-expected.json, closed forms worked apart from this project: beam reach out and back in a steady wind.
 * Computed, with the tolerances given there.
 */
const expected = JSON.parse(readFileSync(new URL('./check-expected.json', import.meta.url), 'utf8'));

describe('the whole check against closed forms', () => {
  const result = check(completeRequest());
  const { tolerance } = expected;

  it('has the state and the totals', () => {
    expect(result.state).toBe(expected.state);
    expect(Math.abs(result.totals.distanceNmi - expected.totals.distanceNmi)).toBeLessThan(tolerance.distanceNmi);
    expect(Math.abs(result.totals.sailedNmi - expected.totals.sailedNmi)).toBeLessThan(tolerance.distanceNmi);
    expect(Math.abs(result.totals.hours! - expected.totals.hours)).toBeLessThan(tolerance.hours);
    expect(result.totals.shunts).toBe(expected.totals.shunts);
  });

  it('has the leg out', () => {
    const [leg] = result.legs;
    const [want] = expected.legs;
    expect(Math.abs(leg!.courseDeg - want.courseDeg)).toBeLessThan(tolerance.courseDeg);
    expect(leg).toMatchObject({ leadingEnd: want.leadingEnd, mode: want.mode, shunts: want.shunts });
    expect(leg!.reefCalls[0]!.reef).toBe(want.firstReefCall);
    expect(leg!.largestLoadShare! / want.largestLoadShare - 1).toBeCloseTo(0, 2);
    expect(Math.abs(leg!.heelingMomentNewtonM! / want.heelingMomentNewtonM - 1)).toBeLessThan(tolerance.relative);
    expect(Math.abs(leg!.rightingMomentNewtonM! / want.rightingMomentNewtonM - 1)).toBeLessThan(tolerance.relative);
  });

  it('has the leg back, with its one shunt', () => {
    const leg = result.legs[1]!;
    const want = expected.legs[1];
    expect(Math.abs(leg.courseDeg - want.courseDeg)).toBeLessThan(tolerance.courseDeg);
    expect(leg).toMatchObject({ leadingEnd: want.leadingEnd, mode: want.mode, shunts: want.shunts });
  });
});
