import { lengthOf } from '@/lib/geo/vector';
import { flagAt, worstSample, type LegContext } from '@/lib/passages/flags/leg-context';
import type { Flag } from '@/lib/passages/passage';
import type { Sample } from '@/lib/passages/sample';

/** Deeper than this one shift can bring the wind to the wrong side. Seamanship judgement without a source (145–155°). */
const DEEP_DEG = 145;
/** Gust over aback limit from which it is worth saying. Seamanship judgement without a source. */
const NEAR_SHARE = 0.8;

/** Deep angles in a wind near the one that takes her over if it comes on the wrong side. docs/model.md §§2, 7. */
export function abackFlags({ prepared, followed }: LegContext): Flag[] {
  const isDeep = ({ decision }: Sample) =>
    decision.sailing.course !== null && Math.abs(decision.sailing.course.windAngleDeg) >= DEEP_DEG;
  const deepest = worstSample(followed.samples, isDeep, (sample) =>
    Math.abs(sample.decision.sailing.course!.windAngleDeg),
  );
  if (!deepest) return [];
  const limitOf = (sample: Sample) => prepared.abackLimitsKn[sample.decision.reefIndex] ?? null;
  const windAngleDeg = Math.abs(deepest.decision.sailing.course!.windAngleDeg);
  if (limitOf(deepest) === null) return [flagAt('aback-not-known', 'caution', deepest, { windAngleDeg })];
  const gustOf = (sample: Sample) => lengthOf(sample.decision.with.wind.gustKn);
  const share = (sample: Sample) => gustOf(sample) / Math.max(limitOf(sample) ?? 0, 1e-6);
  const worst = worstSample(followed.samples, (sample) => isDeep(sample) && share(sample) >= NEAR_SHARE, share);
  if (!worst) return [];
  return [
    flagAt('deep-near-aback-limit', share(worst) >= 1 ? 'danger' : 'caution', worst, {
      windAngleDeg: Math.abs(worst.decision.sailing.course!.windAngleDeg),
      gustKn: gustOf(worst),
      abackLimitKn: limitOf(worst) ?? 0,
      reefIndex: worst.decision.reefIndex,
    }),
  ];
}
