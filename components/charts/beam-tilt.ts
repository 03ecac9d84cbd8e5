/** Tilt of a beam that has fallen. */
export const BEAM_FALLEN_DEG = 24;
/** A slack for k·HM0 = RM0 worked in floating point. */
const SLACK = 1e-9;

/** Level up to a load share of 1/margin, then in proportion, fallen once it is over 1. */
export function beamTiltDeg(loadShare: number, workingMargin: number): number {
  const from = 1 / workingMargin;
  if (loadShare > 1) return BEAM_FALLEN_DEG;
  if (loadShare <= from + SLACK) return 0;
  return 4 + ((loadShare - from) / (1 - from)) * (BEAM_FALLEN_DEG - 10);
}
