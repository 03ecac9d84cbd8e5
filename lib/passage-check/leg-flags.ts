import type { LandIndex } from '@/lib/geo/land';
import { abackFlags } from '@/lib/passages/flags/aback-flags';
import { forecastFlags } from '@/lib/passages/flags/forecast-flags';
import { landFlags } from '@/lib/passages/flags/land-flags';
import type { LegContext } from '@/lib/passages/flags/leg-context';
import { lightFlags } from '@/lib/passages/flags/light-flags';
import { limitFlags } from '@/lib/passages/flags/limit-flags';
import { loadFlags } from '@/lib/passages/flags/load-flags';
import { stopFlag, wayFlags } from '@/lib/passages/flags/way-flags';
import type { FollowedPassage, PassageLeg } from '@/lib/passages/follow-passage';
import type { Flag, Passage } from '@/lib/passages/passage';

/** What a leg is, whether or not it was reached. */
export function aboutLeg({ from, to, corridor, distanceNmi }: PassageLeg) {
  return { from, to, courseDeg: corridor.courseDeg, distanceNmi };
}

/** Everything found on each leg, an empty list where nothing was. */
export function flagsByLeg(
  passage: Passage,
  { prepared, legs }: FollowedPassage,
  land: LandIndex | undefined,
): readonly (readonly Flag[])[] {
  const ofForecast = forecastFlags(passage);
  const stop = legs.find((leg) => leg.followed?.stop)?.followed?.stop;
  return legs.map((leg) => {
    const { followed } = leg;
    if (!followed) return stop ? [stopFlag(stop.reason, null), ...ofForecast] : ofForecast;
    const context: LegContext = { passage, prepared, leg, followed };
    return [
      ...(followed.stop ? [stopFlag(followed.stop.reason, { ...followed.stop.place, time: followed.stop.time })] : []),
      ...loadFlags(context),
      ...wayFlags(context),
      ...landFlags(context, land),
      ...ofForecast,
      ...abackFlags(context),
      ...lightFlags(context),
      ...limitFlags(context),
    ];
  });
}
