import { signedDeg } from '@/lib/geo/angles';
import { toMagnetic, variationDeg } from '@/lib/geo/variation';
import type { CheckResult, LegResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';
import type { EpochMs } from '@/lib/units/quantities';
import type { WindSeries } from '@/lib/weather/series';
import { windAt } from '@/lib/weather/wind-at';
import { countText, degreesOf, hoursText, kilogramMetres, loadShareText, newtonMetres, nmi } from './show';

/** One leg's row of the result, in words and numbers with their units. */
export interface LegFacts {
  readonly index: number;
  readonly leg: LegResult;
  readonly name: string;
  readonly course: string;
  readonly distance: string;
  readonly wind: string;
  readonly way: string;
  readonly end: string;
  readonly shunts: string;
  readonly reefs: readonly string[];
  readonly loadShare: string;
  readonly atRest: string | null;
  readonly heeling: string;
  readonly righting: string;
  readonly times: string;
  readonly duration: string | null;
}

const NOT_KNOWN = 'not known';

export function legFacts(result: CheckResult, plan: PassagePlan, gustFactor: number): LegFacts[] {
  const departureMs = Date.parse(plan.departure);
  const series = { rows: plan.wind.rows.map((row) => ({ ...row, time: Date.parse(row.time) })) } as WindSeries;
  return result.legs.map((leg, index) => {
    const from = plan.route[index];
    const variation = from ? variationDeg(from, departureMs) : null;
    const { heelingMomentNewtonM: heelingNm, rightingMomentNewtonM: rightingNm } = leg;
    return {
      index,
      leg,
      name: `${leg.from} to ${leg.to}`,
      course: `${degreesOf(leg.courseDeg)} T${variation === null ? '' : ` · ${degreesOf(toMagnetic(leg.courseDeg, variation))} M`}`,
      distance: nmi(leg.distanceNmi),
      wind: windWords(leg, series, gustFactor),
      way: leg.mode === 'boards' ? `in boards, ${nmi(leg.sailedNmi ?? 0)} sailed` : (leg.mode ?? NOT_KNOWN),
      end:
        leg.leadingEnd === null ? NOT_KNOWN : leg.leadingEnd === 'both' ? 'A and B in turn' : `${leg.leadingEnd} leads`,
      shunts: leg.start === null ? 'shunts not known' : countText(leg.shunts, 'shunt', 'shunts'),
      reefs: leg.reefCalls.map((call) => `${call.reef}, by ${formatInZone(Date.parse(call.by), plan.zone, 'time')}`),
      loadShare: leg.largestLoadShare === null ? NOT_KNOWN : loadShareText(leg.largestLoadShare),
      atRest: leg.largestLoadShareAtRest === null ? null : loadShareText(leg.largestLoadShareAtRest),
      heeling: heelingNm === null ? NOT_KNOWN : `${kilogramMetres(heelingNm)} (${newtonMetres(heelingNm)})`,
      righting: rightingNm === null ? NOT_KNOWN : `${kilogramMetres(rightingNm)} (${newtonMetres(rightingNm)})`,
      times: timesText(leg, plan.zone),
      duration:
        leg.start !== null && leg.end !== null
          ? hoursText((Date.parse(leg.end) - Date.parse(leg.start)) / 3_600_000)
          : null,
    };
  });
}

/** Wind over the ground against the rhumb line's course, at the leg's start and, where it has moved on, at its end. */
function windWords(leg: LegResult, series: WindSeries, gustFactor: number): string {
  if (leg.start === null) return NOT_KNOWN;
  const first = windOff(leg, series, Date.parse(leg.start), gustFactor);
  const last = leg.end === null ? null : windOff(leg, series, Date.parse(leg.end), gustFactor);
  if (first === null) return NOT_KNOWN;
  if (last === null || last === first) return first;
  const [fromAngle, fromSide] = first.split('° ');
  const [toAngle, toSide] = last.split('° ');
  if (fromSide && fromSide === toSide) return `${fromAngle}°, then ${toAngle}° ${toSide}`;
  return `${first}, then ${last}`;
}

function windOff(leg: LegResult, series: WindSeries, ms: EpochMs, gustFactor: number): string | null {
  const at = windAt(series, ms, gustFactor);
  if (!at.known) return null;
  const off = signedDeg(at.wind.fromDeg - leg.courseDeg);
  const angle = Math.round(Math.abs(off) / 5) * 5;
  if (angle === 0) return 'right ahead';
  if (angle === 180) return 'right astern';
  return `${angle}° to ${off < 0 ? 'port' : 'starboard'}`;
}

function timesText(leg: LegResult, zone: string): string {
  if (leg.start === null) return 'not reached';
  const start = formatInZone(Date.parse(leg.start), zone, 'time');
  const end = leg.end === null ? NOT_KNOWN : formatInZone(Date.parse(leg.end), zone, 'time');
  return `${start}–${end} ${formatInZone(Date.parse(leg.end ?? leg.start), zone, 'zone')}`;
}
