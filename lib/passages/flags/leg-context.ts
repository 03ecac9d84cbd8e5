import type { PassageLeg } from '@/lib/passages/follow-passage';
import type { Flag, FlagCode, Passage, Severity } from '@/lib/passages/passage';
import type { PreparedBoat } from '@/lib/passages/prepared-boat';
import type { FollowedLeg, Sample } from '@/lib/passages/sample';
import type { Place } from '@/lib/passages/sailing';
import type { EpochMs } from '@/lib/units/quantities';
import { MS_PER_MINUTE } from '@/lib/units/constants';

/** What every finder of flags is given. */
export interface LegContext {
  readonly passage: Passage;
  readonly prepared: PreparedBoat;
  readonly leg: PassageLeg;
  readonly followed: FollowedLeg;
}

export function flagAt(
  code: FlagCode,
  severity: Severity,
  where: (Place & { readonly time: EpochMs }) | null,
  numbers: Readonly<Record<string, number>> = {},
): Flag {
  return {
    code,
    severity,
    at: where ? new Date(where.time).toISOString() : null,
    lat: where ? where.lat : null,
    lon: where ? where.lon : null,
    numbers,
  };
}

/** The sample for which `measure` is largest among those that pass, or null if none passes. */
export function worstSample(
  samples: readonly Sample[],
  passes: (sample: Sample) => boolean,
  measure: (sample: Sample) => number,
): Sample | null {
  let worst: Sample | null = null;
  for (const sample of samples) {
    if (passes(sample) && (!worst || measure(sample) > measure(worst))) worst = sample;
  }
  return worst;
}

/** Minutes of the leg that follow samples which pass, each holding until the next. */
export function minutesWhere(followed: FollowedLeg, passes: (sample: Sample) => boolean): number {
  const { samples } = followed;
  const end = followed.end ?? followed.stop?.time ?? followed.start;
  return samples.reduce(
    (sum, sample, index) =>
      passes(sample) ? sum + ((samples[index + 1]?.time ?? end) - sample.time) / MS_PER_MINUTE : sum,
    0,
  );
}
