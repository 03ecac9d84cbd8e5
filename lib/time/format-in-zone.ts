import { clockReadingMs, zoneOffsetMinutes } from '@/lib/time/zone-offset';
import type { EpochMs } from '@/lib/units/quantities';

const WEEKDAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'] as const;
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;

/**
 * - `time`: 14:20
 * - `time-zone`: 14:20 UTC−7
 * - `date`: Mon 1 Jun 2026
 * - `day-time`: Mon 14:20
 * - `date-time`: Mon 1 Jun 2026, 14:20 UTC−7
 * - `input`: 2026-06-01T14:20, as typed fields take it
 * - `zone`: UTC−7
 */
export type TimeStyle = 'time' | 'time-zone' | 'date' | 'day-time' | 'date-time' | 'input' | 'zone';

/**
 * An instant in words, by the clocks of an IANA zone. Minutes are cut, not rounded, so that a time shown has always
 * come. Zones are named by their offset: the same on server and browser, and without doubt at a change of clocks.
 * @throws RangeError where the zone is not in the IANA list.
 */
export function formatInZone(epochMs: EpochMs, zone: string, style: TimeStyle): string {
  const clock = new Date(clockReadingMs(epochMs, zone));
  const iso = clock.toISOString();
  const time = iso.slice(11, 16);
  const day = WEEKDAYS[clock.getUTCDay()];
  const date = `${day} ${clock.getUTCDate()} ${MONTHS[clock.getUTCMonth()]} ${clock.getUTCFullYear()}`;
  switch (style) {
    case 'time':
      return time;
    case 'time-zone':
      return `${time} ${zoneName(epochMs, zone)}`;
    case 'date':
      return date;
    case 'day-time':
      return `${day} ${time}`;
    case 'date-time':
      return `${date}, ${time} ${zoneName(epochMs, zone)}`;
    case 'input':
      return iso.slice(0, 16);
    case 'zone':
      return zoneName(epochMs, zone);
  }
}

function zoneName(epochMs: EpochMs, zone: string): string {
  const offset = Math.round(zoneOffsetMinutes(epochMs, zone));
  if (offset === 0) return 'UTC';
  const hours = Math.floor(Math.abs(offset) / 60);
  const minutes = Math.abs(offset) % 60;
  const size = minutes === 0 ? `${hours}` : `${hours}:${String(minutes).padStart(2, '0')}`;
  return `UTC${offset < 0 ? '−' : '+'}${size}`;
}
