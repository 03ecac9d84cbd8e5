import { mercatorOffsetM } from '@/lib/geo/mercator';
import { crossToStarboard, dot, lengthOf, scale, subtract, vectorToward, type Vector } from '@/lib/geo/vector';
import type { SailingConditions } from '@/lib/passages/sail-heading';
import { shuntDisplacementM, type Place, type Sailing } from '@/lib/passages/sailing';
import { M_S_PER_KNOT } from '@/lib/units/constants';
import type { Metres, Seconds, TrueDegrees } from '@/lib/units/quantities';

/** The leg's line and the room it allows. */
export interface Corridor {
  readonly start: Place;
  readonly target: Place;
  readonly courseDeg: TrueDegrees;
  readonly halfWidthM: Metres;
}

export interface TurnOutlook {
  /** The next shunt is due now: at the corridor's edge or on the layline. */
  readonly due: boolean;
  /** Seconds until it is, on this board; Infinity where nothing asks for one. */
  readonly inSeconds: Seconds;
}

type Boards = Extract<Sailing, { mode: 'boards' }>;

const EDGE_SLACK_M = 0.5;
const LAYLINE_SLACK_S = 0.5;

/** How far off the leg's line, metres, positive to starboard; square to the rhumb line. */
export function offLineM(place: Place, { start, courseDeg }: Corridor): Metres {
  const toStart = mercatorOffsetM(place, start);
  return -crossToStarboard(vectorToward(courseDeg, 1), toStart);
}

/** When she turns on this board: at the corridor's edge or on the layline, both over the ground, whichever is first. */
export function turnOutlook(
  place: Place,
  corridor: Corridor,
  boards: Boards,
  conditions: SailingConditions,
): TurnOutlook {
  const edge = edgeOutlook(place, corridor, boards);
  const layline = laylineOutlook(place, corridor, boards, conditions);
  return { due: edge.due || layline.due, inSeconds: Math.min(edge.inSeconds, layline.inSeconds) };
}

function edgeOutlook(place: Place, corridor: Corridor, boards: Boards): TurnOutlook {
  const along = vectorToward(corridor.courseDeg, 1);
  const lateral = crossToStarboard(along, boards.course.overGroundKn) * M_S_PER_KNOT;
  const otherLateral = crossToStarboard(along, boards.other.overGroundKn);
  if (lateral === 0 || lateral * otherLateral >= 0) return { due: false, inSeconds: Number.POSITIVE_INFINITY };
  const room = corridor.halfWidthM - offLineM(place, corridor) * Math.sign(lateral);
  return { due: room <= EDGE_SLACK_M, inSeconds: Math.max(0, room) / Math.abs(lateral) };
}

/**
 * The layline allows for the shunt's own drift, so that she lies on it when she gathers way. Where that leaves no
 * turn to make (the target nearer than the drift), the plain layline serves.
 */
function laylineOutlook(place: Place, corridor: Corridor, boards: Boards, conditions: SailingConditions): TurnOutlook {
  const offset = mercatorOffsetM(place, corridor.target);
  const allowed = sharesOf(subtract(offset, shuntDisplacementM(conditions)), boards);
  const [onThis, onOther] = allowed[1] > LAYLINE_SLACK_S ? allowed : sharesOf(offset, boards);
  if (onOther <= LAYLINE_SLACK_S) return { due: false, inSeconds: Number.POSITIVE_INFINITY };
  return { due: onThis <= LAYLINE_SLACK_S, inSeconds: Math.max(0, onThis) };
}

/** Seconds on this board and on the other that together cover an offset in metres. */
function sharesOf(offset: Vector, boards: Boards): readonly [Seconds, Seconds] {
  const a = scale(boards.course.overGroundKn, M_S_PER_KNOT);
  const b = scale(boards.other.overGroundKn, M_S_PER_KNOT);
  const determinant = crossToStarboard(a, b);
  if (Math.abs(determinant) < 1e-9) return [Number.POSITIVE_INFINITY, 0];
  return [crossToStarboard(offset, b) / determinant, crossToStarboard(a, offset) / determinant];
}

/**
 * Room to work in boards: a full crossing of the corridor takes at least two shunts' time, and a pair of boards with
 * its two shunts makes good something along the leg. docs/model.md §6.
 */
export function hasRoom(corridor: Corridor, boards: Boards, conditions: SailingConditions): boolean {
  const along = vectorToward(corridor.courseDeg, 1);
  const present = scale(boards.course.overGroundKn, M_S_PER_KNOT);
  const other = scale(boards.other.overGroundKn, M_S_PER_KNOT);
  const lateral = Math.abs(crossToStarboard(along, present));
  const otherLateral = Math.abs(crossToStarboard(along, other));
  if (lateral === 0 || otherLateral === 0) return true;
  const width = 2 * corridor.halfWidthM;
  const shuntS = conditions.boat.shunt.seconds;
  if (width / lateral < 2 * shuntS || width / otherLateral < 2 * shuntS) return false;
  const gained =
    (dot(along, present) * width) / lateral +
    (dot(along, other) * width) / otherLateral +
    2 * dot(along, shuntDisplacementM(conditions));
  return gained > 0;
}

/** Seconds until she passes the target, and by how much she misses it, on a straight run over the ground. */
export function closestApproach(
  offsetM: Vector,
  overGroundKn: Vector,
): { readonly inSeconds: Seconds; readonly missM: Metres } {
  const velocity = scale(overGroundKn, M_S_PER_KNOT);
  const speed = lengthOf(velocity);
  if (speed < 1e-6) return { inSeconds: Number.POSITIVE_INFINITY, missM: lengthOf(offsetM) };
  return {
    inSeconds: dot(offsetM, velocity) / (speed * speed),
    missM: Math.abs(crossToStarboard(velocity, offsetM)) / speed,
  };
}
