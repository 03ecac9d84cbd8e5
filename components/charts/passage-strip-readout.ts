import { mergeReefCalls } from '@/lib/reef-calls/merge-reef-calls';
import type { CheckResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { EpochMs } from '@/lib/units/quantities';
import { windAt } from '@/lib/weather/wind-at';
import { formatInZone } from '@/lib/time/format-in-zone';
import { placeAt } from './place-at';
import { STATE_WORDS } from './state-words';

/** One instant of the passage in words: time, leg and its state, wind, reef called, leading end. */
export function readoutAt(result: CheckResult, plan: PassagePlan, gustFactor: number, ms: EpochMs): string {
  const place = placeAt(result.legs, ms);
  const leg = place ? result.legs[place.legIndex] : undefined;
  const rows = plan.wind.rows.map((row) => ({ ...row, time: Date.parse(row.time) }));
  const at = windAt({ rows } as Parameters<typeof windAt>[0], ms, gustFactor);
  const wind = at.known
    ? `wind from ${degrees(at.wind.fromDeg)} true, mean ${at.wind.meanKn.toFixed(0)} kn, gust ${at.wind.gustKn.toFixed(0)} kn`
    : 'wind not known';
  const call = mergeReefCalls(result.legs)
    .filter((one) => Date.parse(one.at) <= ms)
    .at(-1);
  return [
    formatInZone(ms, plan.zone, 'time-zone'),
    leg && place ? `leg ${place.legIndex + 1} to ${leg.to} (${STATE_WORDS[leg.state]})` : 'place not known',
    wind,
    call ? `reef called: ${call.reef}` : null,
    place ? `${place.end} leads` : null,
  ]
    .filter((part) => part !== null)
    .join(' · ');
}

function degrees(deg: number): string {
  return `${String(Math.round(deg) % 360).padStart(3, '0')}°`;
}
