import type { LeePod } from '@/lib/rigging/craft';
import { DEG_PER_RAD, GRAVITY_M_S2, RAD_PER_DEG, SEA_WATER_KG_M3 } from '@/lib/units/constants';
import type { Degrees, Metres, NewtonMetres, SquareMetres } from '@/lib/units/quantities';

export interface PodBalance {
  /** Depth of the pod's bottom in the water, 0 to its own depth. */
  readonly immersionM: Metres;
  /** The vaka's sinkage that is left when the pod carries its share. */
  readonly sinkageM: Metres;
  readonly momentNm: NewtonMetres;
}

/**
 * The pod at a heel, a box with its bottom's middle at (−yp, hp). It carries weight, so the vaka rises again:
 * immersion and sinkage are solved together. `sinkageM` is the vaka's sinkage with the pod dry.
 * Source: hydrostatics of a box, docs/model.md §2.
 */
export function podBalance(
  pod: LeePod | undefined,
  heelDeg: Degrees,
  sinkageM: Metres,
  vakaWaterplaneM2: SquareMetres,
): PodBalance {
  if (!pod) return { immersionM: 0, sinkageM, momentNm: 0 };
  const heel = heelDeg * RAD_PER_DEG;
  const bottomM2 = pod.lengthM * pod.breadthM;
  const lowered = pod.offsetM * Math.sin(heel) - (pod.bottomHeightM - sinkageM) * Math.cos(heel);
  const immersionM = clamp(lowered / (1 + (bottomM2 * Math.cos(heel)) / vakaWaterplaneM2), 0, pod.depthM);
  return {
    immersionM,
    sinkageM: sinkageM - (bottomM2 * immersionM) / vakaWaterplaneM2,
    momentNm: SEA_WATER_KG_M3 * GRAVITY_M_S2 * bottomM2 * immersionM * pod.offsetM * Math.cos(heel),
  };
}

/** The heel at which the pod's bottom reaches the water, atan((hp − sinkage)/yp); 0 where it is wet at once. */
export function podTouchdownDeg(pod: LeePod, sinkageM: Metres): Degrees {
  return Math.max(0, Math.atan2(pod.bottomHeightM - sinkageM, pod.offsetM) * DEG_PER_RAD);
}

function clamp(value: number, low: number, high: number): number {
  return Math.min(Math.max(value, low), high);
}
