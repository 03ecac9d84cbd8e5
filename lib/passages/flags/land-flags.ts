import type { LandIndex } from '@/lib/geo/land';
import { flagAt, type LegContext } from '@/lib/passages/flags/leg-context';
import type { Flag } from '@/lib/passages/passage';
import type { TrackPoint } from '@/lib/passages/sample';

/** Land on the track as sailed, boards included; outside the chart's box nothing is known of land. */
export function landFlags({ followed, leg }: LegContext, land: LandIndex | undefined): Flag[] {
  const points: readonly TrackPoint[] = followed.track;
  const covered = land !== undefined && points.length > 0 && points.every((point) => land.covers(point));
  const flags: Flag[] = covered ? [] : [flagAt('land-not-checked', 'caution', null)];
  if (!land) return flags;
  for (let i = 0; i < points.length; i += 1) {
    const from = points[i]!;
    const to = points[i + 1];
    const hit = land.isLand(from) ? from : to ? land.crossesLand(from, to) : null;
    if (!hit) continue;
    const share = to ? shareAlong(from, to, hit) : 0;
    const time = from.time + ((to?.time ?? from.time) - from.time) * share;
    flags.unshift(flagAt('land-on-track', 'danger', { lat: hit.lat, lon: hit.lon, time }));
    return flags;
  }
  const ends = leg.corridor.target;
  if (followed.end !== null && land.covers(ends) && land.isLand(ends)) {
    flags.unshift(flagAt('land-on-track', 'danger', { lat: ends.lat, lon: ends.lon, time: followed.end }));
  }
  return flags;
}

function shareAlong(from: TrackPoint, to: TrackPoint, at: { readonly lat: number; readonly lon: number }): number {
  const whole = Math.hypot(to.lat - from.lat, to.lon - from.lon);
  return whole === 0 ? 0 : Math.min(1, Math.hypot(at.lat - from.lat, at.lon - from.lon) / whole);
}
