import type { LegResult } from '@/lib/passages/passage';
import type { EpochMs } from '@/lib/units/quantities';

export interface PlaceOnTrack {
  readonly lat: number;
  readonly lon: number;
  readonly legIndex: number;
  readonly end: 'A' | 'B';
}

/** Where she is at an instant, straight between the points of the track; null where no track reaches. */
export function placeAt(legs: readonly LegResult[], ms: EpochMs): PlaceOnTrack | null {
  for (const [legIndex, leg] of legs.entries()) {
    const last = leg.track[leg.track.length - 1];
    if (!last || ms > Date.parse(last[2])) continue;
    for (let i = 0; i + 1 < leg.track.length; i += 1) {
      const [lon, lat, iso, end] = leg.track[i]!;
      const [nextLon, nextLat, nextIso] = leg.track[i + 1]!;
      const startMs = Date.parse(iso);
      const endMs = Date.parse(nextIso);
      if (ms < startMs || ms > endMs) continue;
      const share = endMs > startMs ? (ms - startMs) / (endMs - startMs) : 0;
      return { lat: lat + (nextLat - lat) * share, lon: lon + (nextLon - lon) * share, legIndex, end };
    }
  }
  return null;
}
