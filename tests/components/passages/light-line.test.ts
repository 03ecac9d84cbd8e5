import { describe, expect, it } from 'vitest';
import { lightText } from '@/components/passages/light-line';

describe('the light of the day of departure', () => {
  it('is said in the zone of the passage', () => {
    // PyEphem 4, horizon −0°34′: sunrise 12:10:08 UTC, sunset 04:17:40 UTC the next day at 48.5 N 123 W.
    const text = lightText(
      { name: 'Off the point', lat: 48.5, lon: -123 },
      Date.parse('2026-06-21T16:00:00Z'),
      'America/Los_Angeles',
    );
    expect(text).toMatch(/^Light at Off the point on Sun 21 Jun 2026: civil dawn 04:\d\d, sunrise 05:(09|10), /);
    expect(text).toMatch(/sunset 21:1[78], civil dusk 21:\d\d \(UTC−7\)\.$/);
  });

  it('is none where the sun does not come to that height', () => {
    const place = { name: 'Far north', lat: 75, lon: 20 };
    const text = lightText(place, Date.parse('2026-06-21T10:00:00Z'), 'UTC');
    expect(text).toContain('civil dawn none, sunrise none, sunset none, civil dusk none');
  });
});
