import { flagAt, minutesWhere, type LegContext } from '@/lib/passages/flags/leg-context';
import type { Flag } from '@/lib/passages/passage';
import type { Sample } from '@/lib/passages/sample';
import { daylightAt } from '@/lib/time/daylight';

/** Sailing after civil dusk or before civil dawn. */
export function lightFlags({ passage, followed }: LegContext): Flag[] {
  const dark = new Map(followed.samples.map((sample) => [sample, daylightAt(sample, sample.time).isDark]));
  const isDark = (sample: Sample) => dark.get(sample) === true;
  const first = followed.samples.find(isDark);
  if (!first) return [];
  const numbers = { minutes: minutesWhere(followed, isDark) };
  const flags = [flagAt('after-dark', 'caution', first, numbers)];
  if (passage.limits?.afterDark === false) flags.push(flagAt('over-dark-limit', 'danger', first, numbers));
  return flags;
}
