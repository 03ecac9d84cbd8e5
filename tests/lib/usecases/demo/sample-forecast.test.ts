import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { windRowsSchema } from '@/lib/schemas/check-request';
import { sampleDeparture, sampleForecast } from '@/lib/usecases/demo/sample-forecast';

const HOUR_MS = 3_600_000;

describe('the sample forecast', () => {
  it('departs at nine in the morning of the next day in its zone, also over a clock change', () => {
    expect(sampleDeparture(new Date('2026-06-01T12:00:00Z')).toISOString()).toBe('2026-06-02T16:00:00.000Z');
    expect(sampleDeparture(new Date('2026-03-07T20:00:00Z')).toISOString()).toBe('2026-03-08T16:00:00.000Z');
    expect(sampleDeparture(new Date('2026-12-31T07:59:59Z')).toISOString()).toBe('2026-12-31T17:00:00.000Z');
  });

  it('is valid at any time, freshly issued, and reaches from now past the departure', () => {
    const anyTime = fc.date({
      min: new Date('2026-01-01T00:00:00Z'),
      max: new Date('2029-01-01T00:00:00Z'),
      noInvalidDate: true,
    });
    fc.assert(
      fc.property(anyTime, (now) => {
        const { rows, issuedAt } = sampleForecast(now);
        expect(windRowsSchema.safeParse(rows).success).toBe(true);
        expect(now.getTime() - Date.parse(issuedAt)).toBeLessThan(HOUR_MS);
        expect(Date.parse(rows[0]!.time)).toBeLessThanOrEqual(now.getTime());
        expect(Date.parse(rows.at(-1)!.time)).toBe(sampleDeparture(now).getTime() + 6 * HOUR_MS);
      }),
    );
  });
});
