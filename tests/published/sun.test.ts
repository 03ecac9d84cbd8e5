import { describe, expect, it } from 'vitest';
import { sunTimesOn } from '@/lib/time/sun-times';
import published from './sun.json';

describe('sun times of almanacs and tables', () => {
  it.each(published.cases)('$id $title: $source', (row) => {
    const times = sunTimesOn(row, row.date, row.zone)!;
    const found =
      row.kind === 'nautical'
        ? { rise: times.nauticalDawn, set: times.nauticalDusk }
        : { rise: times.sunrise, set: times.sunset };
    for (const event of ['rise', 'set'] as const) {
      const expected = row[event];
      if (expected === undefined) continue;
      if (expected === null) expect(found[event]).toBeNull();
      else {
        expect(found[event]).not.toBeNull();
        const seconds = Math.abs(found[event]! - Date.parse(expected)) / 1000;
        expect(seconds, `${event}, seconds off`).toBeLessThanOrEqual(row.toleranceS);
      }
    }
  });
});
