import { formatInZone } from '@/lib/time/format-in-zone';
import { localToUtc } from '@/lib/time/zoned';
import type { EpochMs } from '@/lib/units/quantities';
import type { TimeDraft } from './plan-draft';

export type TimeReading =
  | { readonly kind: 'empty' }
  | { readonly kind: 'instant'; readonly epochMs: EpochMs; readonly twice: boolean }
  | { readonly kind: 'which'; readonly earlierMs: EpochMs; readonly laterMs: EpochMs }
  | { readonly kind: 'problem'; readonly message: string };

const LOCAL = /^(\d{4})-(\d{1,2})-(\d{1,2})[T\s,]+(\d{1,2})(?::|\.|h)?(\d{2})(?::00)?$/i;
const WITH_OFFSET = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d+)?)?(Z|[+-]\d{2}:?\d{2})$/i;

/**
 * Reads "2026-06-01 09:00" in the passage's zone, or an instant with its offset (2026-06-01T16:00:00Z) as forecasts
 * give it. A time skipped by the clocks is a problem; one that happens twice asks which until it is said.
 */
export function readTime(draft: TimeDraft, zone: string): TimeReading {
  const text = draft.text.trim();
  if (text === '') return { kind: 'empty' };
  if (WITH_OFFSET.test(text)) {
    const epochMs = Date.parse(text);
    if (!Number.isNaN(epochMs)) return { kind: 'instant', epochMs, twice: false };
  }
  const match = LOCAL.exec(text);
  if (!match) {
    return { kind: 'problem', message: `“${text}” cannot be read as a time. Write it like 2026-06-01 09:00.` };
  }
  const [year, month, day, hour, minute] = match.slice(1).map(Number) as [number, number, number, number, number];
  if (!isDate(year, month, day)) {
    return { kind: 'problem', message: `${text.slice(0, 10)} is not a day of the calendar.` };
  }
  if (hour > 23 || minute > 59) {
    return { kind: 'problem', message: 'Hours run from 00 to 23, minutes from 00 to 59.' };
  }
  const two = (value: number) => String(value).padStart(2, '0');
  const local = localToUtc(`${year}-${two(month)}-${two(day)}T${two(hour)}:${two(minute)}`, zone);
  if ('problem' in local) return { kind: 'problem', message: local.message };
  if (!('alternativeEpochMs' in local) || local.alternativeEpochMs === undefined) {
    return { kind: 'instant', epochMs: local.epochMs, twice: false };
  }
  const earlierMs = Math.min(local.epochMs, local.alternativeEpochMs);
  const laterMs = Math.max(local.epochMs, local.alternativeEpochMs);
  if (draft.which === '') return { kind: 'which', earlierMs, laterMs };
  return { kind: 'instant', epochMs: draft.which === 'earlier' ? earlierMs : laterMs, twice: true };
}

/** How an instant is typed in the zone; reading it again gives the same instant. */
export function timeToDraft(epochMs: EpochMs, zone: string): TimeDraft {
  const draft: TimeDraft = { text: formatInZone(epochMs, zone, 'input').replace('T', ' '), which: '' };
  const reading = readTime(draft, zone);
  if (reading.kind === 'which') {
    if (reading.earlierMs === epochMs) return { ...draft, which: 'earlier' };
    if (reading.laterMs === epochMs) return { ...draft, which: 'later' };
  }
  if (reading.kind === 'instant' && reading.epochMs === epochMs) return draft;
  return { text: new Date(epochMs).toISOString(), which: '' };
}

function isDate(year: number, month: number, day: number): boolean {
  const date = new Date(Date.UTC(year, month - 1, day));
  return date.getUTCFullYear() === year && date.getUTCMonth() === month - 1 && date.getUTCDate() === day;
}
