import type { RightingCurve } from '@/lib/rigging/righting-curve';

/** The curve for drawing: each half degree, and the corners at lift-off and touchdown. */
export function curvePoints(curve: RightingCurve): readonly { heelDeg: number; momentNm: number }[] {
  const end = curve.vanishingDeg ?? 90;
  const even = Array.from({ length: 181 }, (_, index) => index / 2);
  const corners = [curve.liftOffDeg, curve.touchdownDeg, end].filter((deg): deg is number => deg !== null);
  return [...new Set([...even, ...corners])]
    .filter((deg) => deg <= end)
    .sort((a, b) => a - b)
    .map((heelDeg) => ({ heelDeg, momentNm: curve.momentNmAt(heelDeg) }));
}
