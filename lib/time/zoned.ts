import { clockReadingMs } from '@/lib/time/zone-offset';
import { MS_PER_HOUR } from '@/lib/units/constants';
import type { EpochMs } from '@/lib/units/quantities';

export type LocalInstant =
  | { readonly epochMs: EpochMs; readonly alternativeEpochMs?: EpochMs }
  | { readonly problem: 'gap' | 'not-a-time' | 'unknown-zone'; readonly message: string };

const LOCAL_TIME = /^(\d{4})-(\d{2})-(\d{2})T(\d{2}):(\d{2})(?::(\d{2}))?$/;

/**
 * The instant of a local time such as 2026-06-01T09:00 in an IANA zone. A time that the clocks skip in spring is the
 * problem `gap`; one that they show twice in autumn gives the earlier instant and, as the alternative, the later.
 */
export function localToUtc(local: string, zone: string): LocalInstant {
  const reading = readClock(local);
  if (reading === null) {
    return { problem: 'not-a-time', message: `“${local}” is not a date and time. Write it like 2026-06-01T09:00.` };
  }
  try {
    const [earlier, later] = instantsOf(reading, zone);
    if (earlier === undefined) return gap(local, reading, zone);
    return later === undefined ? { epochMs: earlier } : { epochMs: earlier, alternativeEpochMs: later };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return { problem: 'unknown-zone', message: `“${zone}” is not a time zone of the IANA list.` };
  }
}

/** The clock's reading as if it were UTC; null where the calendar or the clock has no such time. */
function readClock(local: string): EpochMs | null {
  const match = LOCAL_TIME.exec(local);
  if (!match) return null;
  const [year, month, day, hour, minute, second] = match.slice(1).map((part) => Number(part ?? 0)) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  if (hour > 23 || minute > 59 || second > 59) return null;
  const date = new Date(0);
  date.setUTCFullYear(year, month - 1, day);
  if (date.getUTCMonth() !== month - 1 || date.getUTCDate() !== day) return null;
  return date.setUTCHours(hour, minute, second, 0);
}

/** All instants at which the zone's clocks show this reading, earliest first. */
function instantsOf(reading: EpochMs, zone: string): EpochMs[] {
  // The offsets in force a day before and a day after are the only candidates: clocks change once in that time.
  const offsets = [-24, 24].map((hours) => {
    const near = reading + hours * MS_PER_HOUR;
    return clockReadingMs(near, zone) - near;
  });
  return [...new Set(offsets.map((offset) => reading - offset))]
    .filter((instant) => clockReadingMs(instant, zone) === reading)
    .sort((a, b) => a - b);
}

function gap(local: string, reading: EpochMs, zone: string): LocalInstant {
  const before = reading - 24 * MS_PER_HOUR;
  const sameClock = reading - (clockReadingMs(before, zone) - before);
  const shown = new Date(clockReadingMs(sameClock, zone)).toISOString().slice(0, 16).replace('T', ' ');
  return {
    problem: 'gap',
    message: `${local.replace('T', ' ')} does not exist in ${zone}: the clocks skip it. On the old clock it would be ${shown} on the new one.`,
  };
}
