import { flagAt, worstSample, type LegContext } from '@/lib/passages/flags/leg-context';
import { busiestHour } from '@/lib/passages/flags/way-flags';
import type { Flag } from '@/lib/passages/passage';

/** The skipper's own limits of a leg. Hours and darkness are held elsewhere. */
export function limitFlags({ passage, followed }: LegContext): Flag[] {
  const { limits } = passage;
  if (!limits) return [];
  const { samples, shunts } = followed;
  const flags: Flag[] = [];
  if (limits.meanKn !== undefined) {
    const limit = limits.meanKn;
    const worst = worstSample(
      samples,
      ({ wind }) => wind.meanKn > limit,
      ({ wind }) => wind.meanKn,
    );
    if (worst) flags.push(flagAt('over-mean-limit', 'danger', worst, { meanKn: worst.wind.meanKn, limitKn: limit }));
  }
  if (limits.gustKn !== undefined) {
    const limit = limits.gustKn;
    const worst = worstSample(
      samples,
      ({ wind }) => wind.gustKn > limit,
      ({ wind }) => wind.gustKn,
    );
    if (worst) flags.push(flagAt('over-gust-limit', 'danger', worst, { gustKn: worst.wind.gustKn, limitKn: limit }));
  }
  if (limits.loadShare !== undefined) {
    const limit = limits.loadShare;
    const worst = worstSample(
      samples,
      ({ decision }) => decision.load.loadShare > limit,
      ({ decision }) => decision.load.loadShare,
    );
    if (worst) {
      const { loadShare } = worst.decision.load;
      flags.push(flagAt('over-load-share-limit', 'danger', worst, { loadShare, limit }));
    }
  }
  if (limits.shuntsPerHour !== undefined) {
    const busiest = busiestHour(shunts);
    if (busiest && busiest.count > limits.shuntsPerHour) {
      const numbers = { shuntsInAnHour: busiest.count, limit: limits.shuntsPerHour };
      flags.push(flagAt('over-shunts-limit', 'danger', busiest.from, numbers));
    }
  }
  return flags;
}
