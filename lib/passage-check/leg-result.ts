import { aboutLeg } from '@/lib/passage-check/leg-flags';
import type { CheckState, Flag, LegResult, LeadingEnd, ReefCall } from '@/lib/passages/passage';
import type { PassageLeg } from '@/lib/passages/follow-passage';
import type { FollowedLeg, Sample } from '@/lib/passages/sample';
import { worstOf } from '@/lib/passage-check/worst-of';

interface Judged {
  readonly flags: readonly Flag[];
  readonly reefCalls: readonly ReefCall[];
  /** The forecast is too old to carry a verdict: within and little margin become not known. */
  readonly forecastOld: boolean;
}

/** One leg of the reply from the leg as followed. */
export function legResult(leg: PassageLeg, { flags, reefCalls, forecastOld }: Judged): LegResult {
  const { followed } = leg;
  const head = { ...aboutLeg(leg), reefCalls, flags };
  if (!followed) return { ...head, ...NEVER_REACHED };
  const worst = largest(followed.samples, ({ decision }) => decision.load.loadShare);
  const atRest = largest(followed.samples, ({ decision }) => decision.load.atRestShare ?? Number.NEGATIVE_INFINITY);
  const load = worst?.decision.load;
  return {
    ...head,
    sailedNmi: followed.sailedNmi,
    start: iso(followed.start),
    end: followed.end === null ? null : iso(followed.end),
    mode: followed.samples.length === 0 ? null : followed.inBoards ? 'boards' : 'direct',
    leadingEnd: leadingEndOf(followed),
    shunts: followed.shunts.length,
    largestLoadShare: load?.loadShare ?? null,
    largestLoadShareAtRest: atRest?.decision.load.atRestShare ?? null,
    heelingMomentNewtonM: load?.heelingNm ?? null,
    rightingMomentNewtonM: load?.rightingNm ?? null,
    heelDeg: load?.heelDeg ?? null,
    state: stateOf(followed, forecastOld),
    track: followed.track.map((point) => [point.lon, point.lat, iso(point.time), point.end] as const),
  };
}

const NEVER_REACHED = {
  sailedNmi: null,
  start: null,
  end: null,
  mode: null,
  leadingEnd: null,
  shunts: 0,
  largestLoadShare: null,
  largestLoadShareAtRest: null,
  heelingMomentNewtonM: null,
  rightingMomentNewtonM: null,
  heelDeg: null,
  state: 'unknown',
  track: [],
} as const;

function stateOf(followed: FollowedLeg, forecastOld: boolean): CheckState {
  const states: CheckState[] = followed.samples.map(({ decision }) => {
    const { state } = decision.load;
    return forecastOld && state !== 'beyond' ? 'unknown' : state;
  });
  if (followed.stop) states.push('unknown');
  return worstOf(states);
}

/** From the pieces of track sailed, shunts left out; `both` where it changes on the way. */
function leadingEndOf({ samples }: FollowedLeg): LeadingEnd | null {
  const ends = new Set(
    samples
      .filter(({ decision }) => decision.sailing.mode !== 'drift')
      .flatMap(({ decision }) => decision.sailing.end ?? []),
  );
  if (ends.size === 0) return null;
  return ends.size === 2 ? 'both' : [...ends][0]!;
}

function largest(samples: readonly Sample[], measure: (sample: Sample) => number): Sample | undefined {
  let best: Sample | undefined;
  for (const sample of samples) {
    if (measure(sample) > (best ? measure(best) : Number.NEGATIVE_INFINITY)) best = sample;
  }
  return best;
}

function iso(time: number): string {
  return new Date(time).toISOString();
}
