import { flagAt, minutesWhere, type LegContext } from '@/lib/passages/flags/leg-context';
import type { Flag, FlagCode } from '@/lib/passages/passage';
import type { Sample, Shunt, StopReason } from '@/lib/passages/sample';
import { MS_PER_HOUR } from '@/lib/units/constants';

/** Shunts an hour that a crew does in comfort, and the most to plan on: seamanship judgement without a source. */
const COMFORT_SHUNTS_PER_HOUR = 4;
const MOST_SHUNTS_PER_HOUR = 10;

const STOP_CODES: Record<StopReason, FlagCode> = {
  'wind-before-first': 'wind-not-known',
  'wind-shift': 'wind-not-known',
  'wind-over': 'forecast-over',
  stream: 'stream-not-known',
  'no-room': 'no-room',
  'never-reached': 'never-reached',
  'too-long': 'too-long-to-follow',
};

/** Why a leg, and with it all after it, could not be followed to its end. */
export function stopFlag(reason: StopReason, where: Parameters<typeof flagAt>[2]): Flag {
  return flagAt(STOP_CODES[reason], 'danger', where);
}

/** Drifting, and many reversals in one hour. */
export function wayFlags({ followed }: LegContext): Flag[] {
  const flags: Flag[] = [];
  const drifts = ({ decision }: Sample) => decision.sailing.mode === 'drift';
  const first = followed.samples.find(drifts);
  if (first) {
    flags.push(
      flagAt('cannot-be-sailed', 'danger', first, {
        minutes: minutesWhere(followed, drifts),
        meanKn: first.wind.meanKn,
      }),
    );
  }
  const busiest = busiestHour(followed.shunts);
  if (busiest && busiest.count > COMFORT_SHUNTS_PER_HOUR) {
    const severity = busiest.count > MOST_SHUNTS_PER_HOUR ? 'danger' : 'caution';
    flags.push(flagAt('many-shunts', severity, busiest.from, { shuntsInAnHour: busiest.count }));
  }
  return flags;
}

/** The 60 minutes with most shunts in them. */
export function busiestHour(shunts: readonly Shunt[]): { readonly from: Shunt; readonly count: number } | null {
  let busiest: { from: Shunt; count: number } | null = null;
  for (const from of shunts) {
    const count = shunts.filter((shunt) => shunt.time >= from.time && shunt.time < from.time + MS_PER_HOUR).length;
    if (!busiest || count > busiest.count) busiest = { from, count };
  }
  return busiest;
}
