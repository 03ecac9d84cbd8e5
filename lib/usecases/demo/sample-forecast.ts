import { localToUtc } from '@/lib/time/zoned';
import type { PassagePlan } from '@/lib/schemas/passage-plan';

/** Where the sample passage lies. */
export const SAMPLE_ZONE = 'America/Los_Angeles';

const HOUR_MS = 3_600_000;
const STEP_HOURS = 3;

/**
 * An invented wind by hours before (−) and after the sample departure: a quiet evening and
 * night, a southerly that builds from then on, and nothing known after that.
 */
const turningPoints = [
  { hours: -42, fromDeg: 250, meanKn: 9, gustKn: 12 },
  { hours: -30, fromDeg: 240, meanKn: 12, gustKn: 16 },
  { hours: -18, fromDeg: 220, meanKn: 8, gustKn: 11 },
  { hours: -9, fromDeg: 210, meanKn: 8, gustKn: 10 },
  { hours: 0, fromDeg: 200, meanKn: 8, gustKn: 10 },
  { hours: 3, fromDeg: 190, meanKn: 14, gustKn: 19 },
  { hours: 6, fromDeg: 180, meanKn: 23, gustKn: 32 },
] as const;

/** Nine in the morning of the day after `now`, in the sample's zone. */
export function sampleDeparture(now: Date): Date {
  const tomorrow = new Intl.DateTimeFormat('en-CA', { timeZone: SAMPLE_ZONE }).format(now.getTime() + 24 * HOUR_MS);
  const instant = localToUtc(`${tomorrow}T09:00`, SAMPLE_ZONE);
  if ('problem' in instant) throw new Error(instant.message);
  return new Date(instant.epochMs);
}

/** The sample forecast of the demo as if it were issued in the last full hour: a row every three hours. */
export function sampleForecast(now: Date): PassagePlan['wind'] {
  const departure = sampleDeparture(now).getTime();
  const last = turningPoints[turningPoints.length - 1]!.hours;
  const rows = [];
  for (let hours = last; hours >= turningPoints[0].hours; hours -= STEP_HOURS) {
    const time = departure + hours * HOUR_MS;
    rows.unshift({ time: new Date(time).toISOString(), ...windAt(hours) });
    if (time <= now.getTime()) break;
  }
  return {
    source: 'Sample forecast, invented for the demo',
    issuedAt: new Date(Math.floor(now.getTime() / HOUR_MS) * HOUR_MS).toISOString(),
    rows,
  };
}

function windAt(hours: number): { fromDeg: number; meanKn: number; gustKn: number } {
  const next = turningPoints.findIndex((point) => point.hours >= hours);
  const after = turningPoints[next]!;
  const before = turningPoints[next - 1] ?? after;
  const share = after === before ? 0 : (hours - before.hours) / (after.hours - before.hours);
  const between = (a: number, b: number) => Math.round(a + (b - a) * share);
  return {
    fromDeg: between(before.fromDeg, after.fromDeg),
    meanKn: between(before.meanKn, after.meanKn),
    gustKn: between(before.gustKn, after.gustKn),
  };
}
