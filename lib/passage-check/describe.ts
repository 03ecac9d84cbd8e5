import { FLAG_WORDS } from '@/lib/passage-check/flag-words';
import { placeWords } from '@/lib/passage-check/place-words';
import type { CheckState, Flag, FlagCode, LegResult, Waypoint } from '@/lib/passages/passage';
import { formatInZone } from '@/lib/time/format-in-zone';

/** What it takes to speak of a flag as one would aboard. */
export interface LegScene {
  /** From 1. */
  readonly legNumber: number;
  readonly from: Pick<Waypoint, 'name' | 'lat' | 'lon'>;
  readonly to: Pick<Waypoint, 'name' | 'lat' | 'lon'>;
  /** Of the boat sheet, full sail first. */
  readonly reefNames: readonly string[];
  /** IANA; times are said in it. */
  readonly zone: string;
}

export interface Description {
  /** "Leg 3, 14:20, off the point: gust 24 kn gives 1.31 × her righting moment with two panels in." */
  readonly sentence: string;
  readonly remedy: string;
}

/** A flag in words with its numbers, and what may be done about it. */
export function describeFlag(flag: Flag, scene: LegScene): Description {
  const words = FLAG_WORDS[flag.code];
  const reefIndex = flag.numbers.reefIndex;
  const reef = reefIndex === undefined ? undefined : scene.reefNames[reefIndex];
  return {
    sentence: `${whereAndWhen(flag, scene)}: ${words.says(flag.numbers, reef ?? 'the sail she carries')}.`,
    remedy: words.remedy,
  };
}

function whereAndWhen(flag: Flag, { legNumber, from, to, zone }: LegScene): string {
  const parts = [`Leg ${legNumber}`];
  if (flag.at !== null) parts.push(formatInZone(Date.parse(flag.at), zone, 'time'));
  if (flag.lat !== null && flag.lon !== null) parts.push(placeWords({ lat: flag.lat, lon: flag.lon }, from, to));
  return parts.join(', ');
}

const WEIGHT = { danger: 0, caution: 1, notice: 2 } as const;

/** All flags of a leg in words, the gravest first. */
export function describeLeg(leg: Pick<LegResult, 'flags'>, scene: LegScene): readonly (Description & { flag: Flag })[] {
  return [...leg.flags]
    .sort((a, b) => WEIGHT[a.severity] - WEIGHT[b.severity])
    .map((flag) => ({ flag, ...describeFlag(flag, scene) }));
}

/** The flags that make a state; any other flag, however grave, is not why a leg has it. */
const MADE_BY: Readonly<Record<CheckState, readonly FlagCode[]>> = {
  within: [],
  thin: ['little-margin', 'carry-up-to-exceeded'],
  beyond: ['beyond-righting-moment'],
  unknown: [
    'forecast-over',
    'wind-not-known',
    'stream-not-known',
    'no-room',
    'never-reached',
    'too-long-to-follow',
    'forecast-old',
  ],
};

/** Why a leg has its state, in one sentence. */
export function describeLegState(leg: LegResult, scene: LegScene): string {
  const found = describeLeg(leg, scene);
  const first = found.find(({ flag }) => MADE_BY[leg.state].includes(flag.code)) ?? found[0];
  if (leg.state === 'within' || !first) {
    const share = leg.largestLoadShare;
    const said = share === null ? 'its load share is not known' : `load share at most ${share.toFixed(2)}`;
    return `Leg ${scene.legNumber}: ${said}.`;
  }
  return first.sentence;
}

/**
 * Dangers that no state tells of, since a state is about moments alone: land on the track, a limit passed, nothing made
 * good. One sentence a flag, leg by leg; a verdict must not be shown without them.
 */
export function dangersBeside(legs: readonly LegResult[], sceneOf: (legIndex: number) => LegScene): readonly string[] {
  const makeStates = new Set(Object.values(MADE_BY).flat());
  return legs.flatMap((leg, index) =>
    leg.flags
      .filter(({ code, severity }) => severity === 'danger' && !makeStates.has(code))
      .map((flag) => describeFlag(flag, sceneOf(index)).sentence),
  );
}

/** The worst leg of a passage: by state, then by load share. Null without legs. */
export function worstLegIndex(legs: readonly Pick<LegResult, 'state' | 'largestLoadShare'>[]): number | null {
  const grave = { beyond: 3, unknown: 2, thin: 1, within: 0 } as const;
  let worst: number | null = null;
  legs.forEach((leg, index) => {
    const before = worst === null ? null : legs[worst]!;
    const graver = !before || grave[leg.state] > grave[before.state];
    const heavier =
      before &&
      grave[leg.state] === grave[before.state] &&
      (leg.largestLoadShare ?? 0) > (before.largestLoadShare ?? 0);
    if (graver || heavier) worst = index;
  });
  return worst;
}
