import { signedDeg } from '@/lib/geo/angles';
import { crossToStarboard, dot, lengthOf, vectorToward } from '@/lib/geo/vector';
import { sailHeading, type Course, type SailingConditions } from '@/lib/passages/sail-heading';
import { leewayDegAt } from '@/lib/polars/leeway';
import type { TrueDegrees } from '@/lib/units/quantities';

const SCAN_STEP_DEG = 4;
const HALVINGS = 48;
/** Off the course by no more than this, kn: a root, not the jump where the wind changes side. */
const ON_COURSE_KN = 1e-6;

/**
 * The heading that makes good a course against stream and leeway, solved together; null where the stream beats
 * her. Of several, the one that makes good most. The angle may lie outside what she can sail: the caller decides.
 */
export function makeGood(courseDeg: TrueDegrees, conditions: SailingConditions): Course | null {
  const still = lengthOf(conditions.streamKn) < 1e-9;
  const course = still ? inStillWater(courseDeg, conditions) : inStream(courseDeg, conditions);
  return course && dot(vectorToward(courseDeg, 1), course.overGroundKn) > 0 ? course : null;
}

/** Without a stream the water track is the course: turn the heading up by the leeway at its own angle. */
function inStillWater(courseDeg: TrueDegrees, conditions: SailingConditions): Course {
  const { wind, boat } = conditions;
  const trackAngle = signedDeg(wind.fromDeg - courseDeg);
  const wanted = Math.abs(trackAngle);
  let low = 0;
  let high = wanted;
  if (leewayDegAt(boat.leewayDeg, wanted) === 0) low = wanted;
  else if (leewayDegAt(boat.leewayDeg, 0) >= wanted) high = 0;
  for (let i = 0; i < HALVINGS && high > low; i += 1) {
    const middle = (low + high) / 2;
    if (middle + leewayDegAt(boat.leewayDeg, middle) > wanted) high = middle;
    else low = middle;
  }
  const angle = (low + high) / 2;
  const headingDeg = wind.fromDeg - (trackAngle < 0 ? -angle : angle);
  return sailHeading((((headingDeg % 360) + 360) % 360) as TrueDegrees, conditions);
}

function inStream(courseDeg: TrueDegrees, conditions: SailingConditions): Course | null {
  const along = vectorToward(courseDeg, 1);
  const offCourse = (offset: number) =>
    crossToStarboard(along, sailHeading(courseDeg + offset, conditions).overGroundKn);
  let best: Course | null = null;
  let before = offCourse(-180);
  for (let offset = -180; offset < 180; offset += SCAN_STEP_DEG) {
    const after = offCourse(offset + SCAN_STEP_DEG);
    if (before <= 0 !== after <= 0) {
      const root = halve(offCourse, offset, offset + SCAN_STEP_DEG, before);
      const course = sailHeading(courseDeg + root, conditions);
      const holds = Math.abs(crossToStarboard(along, course.overGroundKn)) < ON_COURSE_KN;
      if (holds && (!best || dot(along, course.overGroundKn) > dot(along, best.overGroundKn))) {
        best = { ...course, headingDeg: (((courseDeg + root) % 360) + 360) % 360 };
      }
    }
    before = after;
  }
  return best;
}

function halve(f: (x: number) => number, from: number, to: number, atFrom: number): number {
  let low = from;
  let high = to;
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (f(middle) <= 0 === atFrom <= 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
