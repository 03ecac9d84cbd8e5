import type { Degrees } from '@/lib/units/quantities';

export type PointOfSail = 'close' | 'beam' | 'broad' | 'deep';

interface PointRange {
  readonly point: PointOfSail;
  readonly words: string;
  includes(angleDeg: Degrees): boolean;
}

/** True wind angles that sailors call by one name. Where one ends and the next begins is judgement, no source. */
export const POINTS_OF_SAIL: readonly PointRange[] = [
  { point: 'close', words: 'up to 70°', includes: (angle) => angle <= 70 },
  { point: 'beam', words: '70–110°', includes: (angle) => angle >= 70 && angle <= 110 },
  { point: 'broad', words: '110–140°', includes: (angle) => angle >= 110 && angle <= 140 },
  { point: 'deep', words: '140° and over', includes: (angle) => angle >= 140 },
];
