import type { LegScene } from '@/lib/passage-check/describe';
import type { PassagePlan } from '@/lib/schemas/passage-plan';

/** What the sentences about a leg (counted from 0) need to know of the plan. */
export function legScene(plan: PassagePlan, legIndex: number, reefNames: readonly string[]): LegScene {
  const nowhere = { name: `waypoint ${legIndex + 1}`, lat: 0, lon: 0 };
  return {
    legNumber: legIndex + 1,
    from: plan.route[legIndex] ?? nowhere,
    to: plan.route[legIndex + 1] ?? nowhere,
    reefNames,
    zone: plan.zone,
  };
}
