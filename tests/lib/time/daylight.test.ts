import { describe, expect, it } from 'vitest';
import { daylightAt } from '@/lib/time/daylight';
import { sunTimesOn } from '@/lib/time/sun-times';

const harbour = { lat: 48.5, lon: -123 };
const MINUTE = 60_000;

describe('daylight', () => {
  it.each(['2026-03-20', '2026-06-21', '2026-10-01', '2026-12-21'])(
    'turns dark at civil dusk and light at civil dawn of %s, within half a minute',
    (date) => {
      const { civilDawn, civilDusk } = sunTimesOn(harbour, date, 'America/Vancouver')!;
      expect(daylightAt(harbour, civilDusk! - MINUTE / 2).isDark).toBe(false);
      expect(daylightAt(harbour, civilDusk! + MINUTE / 2).isDark).toBe(true);
      expect(daylightAt(harbour, civilDawn! - MINUTE / 2).isDark).toBe(true);
      expect(daylightAt(harbour, civilDawn! + MINUTE / 2).isDark).toBe(false);
      expect(daylightAt(harbour, civilDusk!).sunAltitudeDeg).toBeCloseTo(-6, 1);
    },
  );

  it('has the sun at -0.833° at sunset, refraction left out, and no jump at the horizon', () => {
    const { sunset } = sunTimesOn(harbour, '2026-06-21', 'America/Vancouver')!;
    expect(daylightAt(harbour, sunset!).sunAltitudeDeg).toBeCloseTo(-0.833, 1);
    for (let second = -900; second < 0; second += 10) {
      const now = daylightAt(harbour, sunset! + second * 1000).sunAltitudeDeg;
      const next = daylightAt(harbour, sunset! + (second + 10) * 1000).sunAltitudeDeg;
      expect(now - next).toBeGreaterThan(0);
      expect(now - next).toBeLessThan(0.05);
    }
  });

  it('stands highest near 65° on midsummer day at 48.5° north', () => {
    expect(daylightAt(harbour, Date.parse('2026-06-21T20:14:00Z')).sunAltitudeDeg).toBeCloseTo(90 - 48.5 + 23.44, 1);
  });
});

describe('sun times', () => {
  it('keeps the order of a day, all on the local date', () => {
    const times = sunTimesOn(harbour, '2026-06-21', 'America/Vancouver')!;
    const order = [
      times.nauticalDawn,
      times.civilDawn,
      times.sunrise,
      times.sunset,
      times.civilDusk,
      times.nauticalDusk,
    ] as number[];
    expect([...order].sort((a, b) => a - b)).toEqual(order);
    expect(order[0]).toBeGreaterThan(Date.parse('2026-06-21T07:00:00Z'));
    expect(order[5]).toBeLessThan(Date.parse('2026-06-22T07:00:00Z'));
  });

  it('has neither sunset nor dusk under the midnight sun', () => {
    const times = sunTimesOn({ lat: 70, lon: 20 }, '2026-06-21', 'Europe/Oslo')!;
    expect(times.sunset).toBeNull();
    expect(times.civilDusk).toBeNull();
  });

  it('is null for a date or a zone that does not exist', () => {
    expect(sunTimesOn(harbour, '2026-02-30', 'America/Vancouver')).toBeNull();
    expect(sunTimesOn(harbour, '2026-02-20', 'Atlantis/Harbour')).toBeNull();
  });
});
