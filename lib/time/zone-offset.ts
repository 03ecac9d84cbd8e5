import type { EpochMs } from '@/lib/units/quantities';

/** One formatter a zone: making one costs far more than using it. */
const formatters = new Map<string, Intl.DateTimeFormat>();

/** @throws RangeError where the zone is not in the IANA list. */
function formatterOf(zone: string): Intl.DateTimeFormat {
  const known = formatters.get(zone);
  if (known) return known;
  const made = new Intl.DateTimeFormat('en-GB', {
    timeZone: zone,
    calendar: 'gregory',
    numberingSystem: 'latn',
    hourCycle: 'h23',
    era: 'short',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: 'numeric',
    minute: 'numeric',
    second: 'numeric',
  });
  formatters.set(zone, made);
  return made;
}

/**
 * What the clocks of an IANA zone read at an instant, written as if it were UTC: the offset is the difference.
 * Whole seconds are read from the zone, what is left of the instant is carried over.
 * @throws RangeError where the zone is not in the IANA list.
 */
export function clockReadingMs(epochMs: EpochMs, zone: string): EpochMs {
  const parts = new Map(
    formatterOf(zone)
      .formatToParts(new Date(epochMs))
      .map(({ type, value }) => [type, value]),
  );
  const number = (type: Intl.DateTimeFormatPartTypes) => Number(parts.get(type));
  const year = parts.get('era')?.startsWith('B') ? 1 - number('year') : number('year');
  const reading = new Date(0);
  reading.setUTCFullYear(year, number('month') - 1, number('day'));
  reading.setUTCHours(number('hour'), number('minute'), number('second'), ((epochMs % 1000) + 1000) % 1000);
  return reading.getTime();
}

/** Minutes that a zone's clocks are ahead of UTC at an instant. @throws RangeError for an unknown zone. */
export function zoneOffsetMinutes(epochMs: EpochMs, zone: string): number {
  return (clockReadingMs(epochMs, zone) - epochMs) / 60_000;
}
