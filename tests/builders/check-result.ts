import type { CheckResult, LegResult } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';

/** A made-up check of two legs: the first within limits, the second beyond righting moment with a shunt on the way. */
export function buildLeg(change: Partial<LegResult> = {}): LegResult {
  return {
    from: 'the beach',
    to: 'the point',
    courseDeg: 180,
    distanceNmi: 5,
    sailedNmi: 5,
    start: '2026-06-01T16:00:00.000Z',
    end: '2026-06-01T17:00:00.000Z',
    mode: 'direct',
    leadingEnd: 'B',
    shunts: 0,
    reefCalls: [call('full sail', '2026-06-01T16:00:00.000Z')],
    largestLoadShare: 0.5,
    largestLoadShareAtRest: null,
    heelingMomentNewtonM: 1600,
    rightingMomentNewtonM: 3200,
    heelDeg: 2,
    state: 'within',
    flags: [],
    track: [
      [-123, 48.6, '2026-06-01T16:00:00.000Z', 'B'],
      [-123, 48.52, '2026-06-01T17:00:00.000Z', 'B'],
    ],
    ...change,
  };
}

function call(reef: string, at: string, by = at) {
  return { reef, at, by, lat: 48.55, lon: -123, meanKn: 18, gustKn: 24 };
}

export function buildCheckResult(change: Partial<CheckResult> = {}): CheckResult {
  return {
    engineVersion: '1.0.0',
    caution: 'An aid, not a permission.',
    state: 'beyond',
    totals: {
      distanceNmi: 9,
      sailedNmi: 9.8,
      hours: 2,
      arrival: '2026-06-01T18:00:00.000Z',
      shunts: 1,
      largestLoadShare: 1.31,
    },
    legs: [buildLeg(), buildSecondLeg()],
    warnings: [],
    ...change,
  };
}

export function buildSecondLeg(change: Partial<LegResult> = {}): LegResult {
  return buildLeg({
    from: 'the point',
    to: 'the narrows',
    courseDeg: 270,
    distanceNmi: 4,
    sailedNmi: 4.8,
    start: '2026-06-01T17:00:00.000Z',
    end: '2026-06-01T18:00:00.000Z',
    mode: 'boards',
    leadingEnd: 'both',
    shunts: 1,
    reefCalls: [
      call('full sail', '2026-06-01T17:00:00.000Z'),
      call('one panel in', '2026-06-01T17:15:00.000Z', '2026-06-01T17:30:00.000Z'),
    ],
    largestLoadShare: 1.31,
    heelingMomentNewtonM: 4192,
    heelDeg: null,
    state: 'beyond',
    flags: [
      {
        code: 'beyond-righting-moment',
        severity: 'danger',
        at: '2026-06-01T17:35:00.000Z',
        lat: 48.52,
        lon: -123.05,
        numbers: { gustKn: 24, loadShare: 1.31, reefIndex: 1 },
      },
    ],
    track: [
      [-123, 48.52, '2026-06-01T17:00:00.000Z', 'B'],
      [-123.05, 48.5, '2026-06-01T17:30:00.000Z', 'A'],
      [-123.1, 48.52, '2026-06-01T18:00:00.000Z', 'A'],
    ],
    ...change,
  });
}

export function buildPlan(change: Partial<PassagePlan> = {}): PassagePlan {
  return {
    name: 'To the narrows',
    zone: 'America/Vancouver',
    departure: '2026-06-01T16:00:00.000Z',
    route: [
      { name: 'the beach', lat: 48.6, lon: -123, corridorHalfWidthM: 1000 },
      { name: 'the point', lat: 48.52, lon: -123, corridorHalfWidthM: 1000 },
      { name: 'the narrows', lat: 48.52, lon: -123.1, corridorHalfWidthM: 500 },
    ],
    wind: {
      source: 'by radio',
      issuedAt: '2026-06-01T12:00:00.000Z',
      rows: [
        { time: '2026-06-01T15:00:00.000Z', fromDeg: 270, meanKn: 12, gustKn: 16 },
        { time: '2026-06-01T21:00:00.000Z', fromDeg: 290, meanKn: 20, gustKn: 27 },
      ],
    },
    streamRows: [],
    limits: {},
    ...change,
  };
}

/** A small invented craft: only as much of a sheet as the result shows. */
export function buildSheet(): BoatSheet {
  return {
    spanM: 2.9,
    masses: [{ label: 'ama', kg: 112.5, yM: 2.9, zM: 0.1, kind: 'structure' }],
    pressure: { coefficient: 1.4 },
    centreOfLateralResistanceM: 0,
    gustFactor: 1.35,
    workingMargin: 1.5,
    windHeightExponent: 0,
    reefs: [
      { name: 'full sail', areaM2: 14, centreHeightM: 2.8, speedFactor: 1 },
      { name: 'one panel in', areaM2: 9, centreHeightM: 2.2, speedFactor: 0.9 },
    ],
    polar: { windSpeedsKn: [10], windAnglesDeg: [50, 150], speedsKn: [[5, 5]] },
    leewayDeg: 0,
    shunt: { seconds: 60, driftKn: 1 },
    notes: '',
  };
}
