import { mercatorOffsetM } from '@/lib/geo/mercator';
import { rhumbInverse } from '@/lib/geo/rhumb';
import { add, dot, lengthOf, scale, vectorFrom, type Vector } from '@/lib/geo/vector';
import { conditionsAt, type Conditions } from '@/lib/passages/conditions';
import { decide, decisionWith, type Decision } from '@/lib/passages/decide';
import type { Passage } from '@/lib/passages/passage';
import type { PreparedBoat } from '@/lib/passages/prepared-boat';
import type { FollowedLeg, Sample, Shunt, StopReason, TrackPoint } from '@/lib/passages/sample';
import { shuntDisplacementM, type End, type Place } from '@/lib/passages/sailing';
import { moved, sameDecision, sameWay, type Step } from '@/lib/passages/step';
import { closestApproach, hasRoom, turnOutlook, type Corridor } from '@/lib/passages/turns';
import { METRES_PER_NMI, M_S_PER_KNOT, MS_PER_HOUR, MS_PER_MINUTE } from '@/lib/units/constants';
import type { EpochMs, Knots } from '@/lib/units/quantities';

const LONGEST_STEP_MS = 5 * MS_PER_MINUTE;
/** Passing a waypoint this close on a board is reaching it: nobody shunts for the last metres. */
const REACHED_WITHIN_M = 25;
/** Nor for less than a shunt would drift, as far as that is a small part of the corridor. */
const REACHED_WITHIN_CORRIDOR_SHARE = 1 / 4;
const ARRIVED_WITHIN_M = 0.5;
/** docs/model.md §6: after six hours under 0.2 kn made good the rest is not known. */
const SLOW_KN = 0.2;
const SLOW_FOR_MS = 6 * MS_PER_HOUR;
const MOST_STEPS = 6000;
const CHANGE_FOUND_WITHIN_MS = 500;

export interface Voyage {
  readonly passage: Passage;
  readonly prepared: PreparedBoat;
  readonly breakpoints: readonly EpochMs[];
}

/** Where she is and how, between legs. */
export interface Cursor extends Place {
  readonly time: EpochMs;
  readonly end: End | null;
  /** Since when she has made good less than 0.2 kn; null while she gets on. */
  readonly slowSince: EpochMs | null;
}

/** Sails one leg on paper from where the last one ended. docs/model.md §§6–7. */
export function followLeg(voyage: Voyage, from: Cursor, corridor: Corridor): { leg: FollowedLeg; cursor: Cursor } {
  return new LegFollower(voyage, from, corridor).run();
}

/** The walk along one leg. A class, because a dozen small steps share its place, time and records. */
class LegFollower {
  private time: EpochMs;
  private place: Place;
  private end: End | null;
  private slowSince: EpochMs | null;
  private sailedM = 0;
  private inBoards = false;
  private readonly samples: Sample[] = [];
  private readonly shunts: Shunt[] = [];
  private readonly track: TrackPoint[] = [];

  constructor(
    private readonly voyage: Voyage,
    private readonly from: Cursor,
    private readonly corridor: Corridor,
  ) {
    this.time = from.time;
    this.place = { lat: from.lat, lon: from.lon };
    this.end = from.end;
    this.slowSince = from.slowSince;
  }

  run(): { leg: FollowedLeg; cursor: Cursor } {
    const stop = this.walk();
    const arrived = stop === null;
    const leg: FollowedLeg = {
      start: this.from.time,
      samples: this.samples,
      shunts: this.shunts,
      track: this.track,
      sailedNmi: this.sailedM / METRES_PER_NMI,
      inBoards: this.inBoards,
      end: arrived ? this.time : null,
      stop: arrived ? null : { reason: stop, time: this.time, place: this.place },
    };
    return { leg, cursor: { ...this.place, time: this.time, end: this.end, slowSince: this.slowSince } };
  }

  /** Null on arrival, else why it stopped. */
  private walk(): StopReason | null {
    for (let step = 0; step < MOST_STEPS; step += 1) {
      const now = conditionsAt(this.voyage.passage, this.time);
      if (!now.known) return now.reason;
      const decision = this.decideAt(now.conditions, this.place);
      this.record(decision, now.conditions);
      if (this.remainingM() <= ARRIVED_WITHIN_M) return null;
      const soon = conditionsAt(this.voyage.passage, this.time + 1);
      if (!soon.known) return soon.reason;
      const { sailing } = decision;
      if (sailing.mode === 'boards') {
        if (this.remainingM() <= this.reachM(decision)) return null;
        this.inBoards = true;
        if (!hasRoom(this.corridor, sailing, decision.with)) return 'no-room';
        if (turnOutlook(this.place, this.corridor, sailing, decision.with).due) {
          const lost = this.shunt(decision, sailing.end === 'A' ? 'B' : 'A');
          if (lost) return lost;
          continue;
        }
      }
      if (sailing.end !== null && this.end !== null && sailing.end !== this.end) {
        const lost = this.shunt(decision, sailing.end);
        if (lost) return lost;
        continue;
      }
      this.end = sailing.end ?? this.end;
      if (this.advance(decision)) return null;
      if (this.slowSince !== null && this.time - this.slowSince >= SLOW_FOR_MS) return 'never-reached';
    }
    return 'too-long';
  }

  /** One step of at most five minutes. True on arrival. */
  private advance(decision: Decision): boolean {
    const longest = Math.min(LONGEST_STEP_MS, this.toNextBreakpointMs());
    let step = this.planStep(decision, longest, 0);
    step = this.planStep(decision, longest, step.ms);
    let arrived = step.arrives;
    const changedAt = this.firstChangeMs(decision, step);
    if (changedAt !== null) {
      step = { ...step, ms: changedAt };
      arrived = false;
    }
    this.track.push({ ...this.place, time: this.time, end: this.end ?? 'A' });
    const slow = step.madeGoodKn < SLOW_KN;
    this.slowSince = slow ? (this.slowSince ?? this.time) : null;
    this.sailedM += (step.throughWaterKn * M_S_PER_KNOT * step.ms) / 1000;
    this.move(step.overGroundKn, step.ms);
    if (arrived) this.recordArrival(decision);
    return arrived;
  }

  /** Length of the step and the velocity over it, taken at its middle: second order in wind and stream. */
  private planStep(decision: Decision, longestMs: number, guessMs: number): Step {
    const middle = conditionsAt(this.voyage.passage, this.time + (guessMs || longestMs) / 2);
    const at = middle.known ? this.decideLike(decision, middle.conditions) : decision;
    const { sailing } = at;
    const streamKn = at.with.streamKn;
    const overGroundKn = sailing.course ? sailing.course.overGroundKn : streamKn;
    const offset = mercatorOffsetM(this.place, this.corridor.target);
    const approach = closestApproach(offset, overGroundKn);
    const direct = sailing.mode === 'direct';
    const reaches = direct || approach.missM <= this.reachM(at);
    const arrivalMs = direct
      ? (this.remainingM() / (lengthOf(overGroundKn) * M_S_PER_KNOT)) * 1000
      : reaches && approach.inSeconds > 0
        ? approach.inSeconds * 1000
        : Number.POSITIVE_INFINITY;
    const turnMs =
      sailing.mode === 'boards'
        ? turnOutlook(this.place, this.corridor, sailing, at.with).inSeconds * 1000
        : Number.POSITIVE_INFINITY;
    const ms = Math.max(1, Math.min(longestMs, arrivalMs, turnMs));
    return {
      ms,
      overGroundKn,
      throughWaterKn: sailing.course ? lengthOf(sailing.course.throughWaterKn) : 0,
      madeGoodKn: sailing.mode === 'boards' ? sailing.pairKn : dot(overGroundKn, scale(offset, 1 / lengthOf(offset))),
      arrives: ms === arrivalMs,
      event: ms === arrivalMs || ms === turnMs,
    };
  }

  /** The same way of sailing under other conditions; the decision itself where that has changed. */
  private decideLike(decision: Decision, conditions: Conditions): Decision {
    const there = decisionWith(
      this.voyage.prepared,
      conditions,
      this.place,
      this.corridor.target,
      this.end,
      decision.reefIndex,
    );
    return sameWay(there.sailing, decision.sailing) ? there : decision;
  }

  /**
   * When within the step the reef or the way of sailing first changes, ms from now; records the last instant before it.
   * A step that ends in a turn or at the waypoint changes the way by itself: there only the reef is looked at, short of
   * the end.
   */
  private firstChangeMs(decision: Decision, { ms, event, overGroundKn }: Step): number | null {
    const sampleAt = (after: number) => {
      const there = conditionsAt(this.voyage.passage, this.time + after);
      if (!there.known) return null;
      const place = moved(this.place, overGroundKn, after);
      return { place, conditions: there.conditions, decision: this.decideAt(there.conditions, place) };
    };
    const differs = (after: number) => {
      const there = sampleAt(after);
      if (!there) return false;
      return event ? there.decision.reefIndex !== decision.reefIndex : !sameDecision(there.decision, decision);
    };
    let high = event ? ms - CHANGE_FOUND_WITHIN_MS : ms;
    if (high <= 0 || !differs(high)) return null;
    let low = 0;
    while (high - low > CHANGE_FOUND_WITHIN_MS) {
      const middle = (low + high) / 2;
      if (differs(middle)) high = middle;
      else low = middle;
    }
    const before = low > 0 ? sampleAt(low) : null;
    if (before) {
      this.samples.push({
        ...before.place,
        time: this.time + low,
        wind: before.conditions.wind,
        decision: before.decision,
      });
    }
    return high;
  }

  /** Stops, swaps ends and gathers way: time passes, she drifts. Why it stopped where the wind ends meanwhile. */
  private shunt(decision: Decision, to: End): StopReason | null {
    this.shunts.push({ ...this.place, time: this.time, to });
    let leftMs = this.voyage.passage.boat.shunt.seconds * 1000;
    while (leftMs > 0) {
      const ms = Math.min(leftMs, LONGEST_STEP_MS, this.toNextBreakpointMs());
      const middle = conditionsAt(this.voyage.passage, this.time + ms / 2);
      if (!middle.known) return middle.reason;
      const at = decisionWith(
        this.voyage.prepared,
        middle.conditions,
        this.place,
        this.corridor.target,
        this.end,
        decision.reefIndex,
      );
      const driftKn: Knots = at.with.wind.meanKn > 0 ? this.voyage.passage.boat.shunt.driftKn : 0;
      this.track.push({ ...this.place, time: this.time, end: this.end ?? to });
      this.move(add(vectorFrom(at.with.wind.fromDeg, driftKn), at.with.streamKn), ms);
      leftMs -= ms;
    }
    this.end = to;
    return null;
  }

  private decideAt(conditions: Conditions, place: Place): Decision {
    return decide(this.voyage.prepared, conditions, place, this.corridor.target, this.end);
  }

  private record(decision: Decision, conditions: Conditions): void {
    this.samples.push({ ...this.place, time: this.time, wind: conditions.wind, decision });
  }

  /** The last instant of the leg, on its own course still; past the last row of wind it has none. */
  private recordArrival(decision: Decision): void {
    this.track.push({ ...this.place, time: this.time, end: this.end ?? 'A' });
    const now = conditionsAt(this.voyage.passage, this.time);
    if (!now.known) return;
    // A hair before the waypoint, so that the bearing to it still is the leg's own.
    const last = this.samples[this.samples.length - 1]!;
    const before = decide(this.voyage.prepared, now.conditions, last, this.corridor.target, this.end);
    this.record(sameWay(before.sailing, decision.sailing) ? before : decision, now.conditions);
  }

  private move(overGroundKn: Vector, ms: number): void {
    this.place = moved(this.place, overGroundKn, ms);
    this.time += ms;
  }

  private reachM(decision: Decision): number {
    const driftM = lengthOf(shuntDisplacementM(decision.with));
    return Math.max(REACHED_WITHIN_M, Math.min(driftM, this.corridor.halfWidthM * REACHED_WITHIN_CORRIDOR_SHARE));
  }

  private remainingM(): number {
    return rhumbInverse(this.place, this.corridor.target).distanceM;
  }

  private toNextBreakpointMs(): number {
    const next = this.voyage.breakpoints.find((time) => time > this.time);
    return next === undefined ? LONGEST_STEP_MS : next - this.time;
  }
}
