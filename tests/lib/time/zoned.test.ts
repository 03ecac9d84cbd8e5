import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatInZone } from '@/lib/time/format-in-zone';
import { localToUtc } from '@/lib/time/zoned';

describe('local time to an instant', () => {
  it.each([
    ['2026-06-01T09:00', 'America/Vancouver', '2026-06-01T16:00:00.000Z'],
    ['2026-01-15T12:30', 'Europe/London', '2026-01-15T12:30:00.000Z'],
    ['2026-07-15T12:30:20', 'Asia/Kolkata', '2026-07-15T07:00:20.000Z'],
    ['2026-07-15T12:30', 'Asia/Kathmandu', '2026-07-15T06:45:00.000Z'],
    ['2026-12-31T23:59', 'Pacific/Kiritimati', '2026-12-31T09:59:00.000Z'],
    ['2028-02-29T00:00', 'UTC', '2028-02-29T00:00:00.000Z'],
  ])('%s in %s is %s', (local, zone, expected) => {
    expect(localToUtc(local, zone)).toEqual({ epochMs: Date.parse(expected) });
  });

  it.each([
    ['2026-03-08T02:30', 'America/New_York'],
    ['2026-03-29T01:00', 'Europe/London'],
    ['2026-10-04T02:15', 'Australia/Lord_Howe'],
    ['2011-12-30T12:00', 'Pacific/Apia'],
  ])('%s in %s is skipped by the clocks', (local, zone) => {
    const answer = localToUtc(local, zone);
    expect(answer).toMatchObject({ problem: 'gap' });
    expect('message' in answer && answer.message).toContain('does not exist');
  });

  it.each([
    ['2026-11-01T01:30', 'America/New_York', '2026-11-01T05:30:00.000Z', '2026-11-01T06:30:00.000Z'],
    ['2026-10-25T01:00', 'Europe/London', '2026-10-25T00:00:00.000Z', '2026-10-25T01:00:00.000Z'],
    // Half an hour of change.
    ['2026-04-05T01:45', 'Australia/Lord_Howe', '2026-04-04T14:45:00.000Z', '2026-04-04T15:15:00.000Z'],
  ])('%s in %s happens twice', (local, zone, first, second) => {
    expect(localToUtc(local, zone)).toEqual({ epochMs: Date.parse(first), alternativeEpochMs: Date.parse(second) });
  });

  it.each(['2026-02-30T10:00', '2026-13-01T10:00', '2026-01-01T24:00', '2026-01-01T10:60', 'soon', '2026-01-01'])(
    'refuses %s',
    (local) => {
      expect(localToUtc(local, 'UTC')).toMatchObject({ problem: 'not-a-time' });
    },
  );

  it('refuses a zone that does not exist', () => {
    expect(localToUtc('2026-01-01T10:00', 'Atlantis/Harbour')).toMatchObject({ problem: 'unknown-zone' });
  });

  it('reads back every instant that it shows, in zones of every kind', () => {
    const zones = fc.constantFrom(
      'America/Vancouver',
      'America/St_Johns',
      'Europe/Lisbon',
      'Asia/Kolkata',
      'Asia/Kathmandu',
      'Australia/Adelaide',
      'Australia/Lord_Howe',
      'Pacific/Chatham',
      'Pacific/Auckland',
      'Africa/Casablanca',
      'UTC',
    );
    // Whole minutes of the years 2020 to 2035.
    const minutes = fc.integer({ min: Date.UTC(2020, 0, 1) / 60_000, max: Date.UTC(2035, 0, 1) / 60_000 });
    fc.assert(
      fc.property(zones, minutes, (zone, minute) => {
        const epochMs = minute * 60_000;
        const answer = localToUtc(formatInZone(epochMs, zone, 'input'), zone);
        expect('epochMs' in answer).toBe(true);
        if (!('epochMs' in answer)) return;
        expect([answer.epochMs, answer.alternativeEpochMs]).toContain(epochMs);
      }),
      { numRuns: 2000 },
    );
  });
});

describe('an instant in words', () => {
  const instant = Date.parse('2026-06-01T16:00:59.999Z');

  it.each([
    ['time', '09:00'],
    ['time-zone', '09:00 UTC−7'],
    ['date', 'Mon 1 Jun 2026'],
    ['day-time', 'Mon 09:00'],
    ['date-time', 'Mon 1 Jun 2026, 09:00 UTC−7'],
    ['input', '2026-06-01T09:00'],
    ['zone', 'UTC−7'],
  ] as const)('%s: %s', (style, expected) => {
    expect(formatInZone(instant, 'America/Vancouver', style)).toBe(expected);
  });

  it.each([
    ['UTC', '16:00 UTC'],
    ['Asia/Kathmandu', '21:45 UTC+5:45'],
    ['America/St_Johns', '13:30 UTC−2:30'],
  ])('in %s is %s', (zone, expected) => {
    expect(formatInZone(instant, zone, 'time-zone')).toBe(expected);
  });

  it('tells apart the two hours at the change of clocks', () => {
    const first = Date.parse('2026-11-01T05:30:00Z');
    expect(formatInZone(first, 'America/New_York', 'time-zone')).toBe('01:30 UTC−4');
    expect(formatInZone(first + 3_600_000, 'America/New_York', 'time-zone')).toBe('01:30 UTC−5');
  });
});
