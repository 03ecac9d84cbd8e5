import { passagePlanSchema, type PassagePlan } from '@/lib/schemas/passage-plan';
import { toPointer } from '@/lib/schemas/to-field-problems';
import type { PlanDraft, TimeDraft } from './plan-draft';
import { readCoordinate } from './read-coordinate';
import { readNumber, readOptionalNumber } from './read-number';
import { readTime } from './read-time';

/** Message by JSON pointer of the plan's field: "/route/0/lat". */
export type Problems = ReadonlyMap<string, string>;

export interface PlanReading {
  /** Null as long as anything cannot be read or is impossible. */
  readonly plan: PassagePlan | null;
  readonly problems: Problems;
  /** Pointers of fields that are only empty: nothing wrong was typed there. */
  readonly missing: ReadonlySet<string>;
}

/** The typed plan as the schema takes it, with one message for each field that does not read. Nothing is thrown away. */
export function readPlan(draft: PlanDraft): PlanReading {
  const problems = new Map<string, string>();
  const missing = new Set<string>();
  const zone = isZone(draft.zone) ? draft.zone : 'UTC';

  const time = (pointer: string, what: string, value: TimeDraft): string => {
    const reading = readTime(value, zone);
    if (reading.kind === 'instant') return new Date(reading.epochMs).toISOString();
    if (reading.kind === 'empty') missing.add(pointer);
    problems.set(pointer, messageFor(what, reading));
    return '';
  };
  const coordinate = (pointer: string, text: string, axis: 'lat' | 'lon'): number => {
    const reading = readCoordinate(text, axis);
    if ('value' in reading) return reading.value;
    if (text.trim() === '') missing.add(pointer);
    problems.set(pointer, reading.problem);
    return Number.NaN;
  };
  const needed = (pointer: string, text: string): number => {
    if (text.trim() === '') missing.add(pointer);
    return readNumber(text);
  };
  const words = (pointer: string, text: string): string => {
    if (text.trim() === '') missing.add(pointer);
    return text;
  };

  const { limits } = draft;
  const parsed = passagePlanSchema.safeParse({
    name: words('/name', draft.name),
    zone: draft.zone,
    departure: time('/departure', 'Departure', draft.departure),
    route: draft.waypoints.map((waypoint, i) => ({
      name: words(`/route/${i}/name`, waypoint.name),
      lat: coordinate(`/route/${i}/lat`, waypoint.lat, 'lat'),
      lon: coordinate(`/route/${i}/lon`, waypoint.lon, 'lon'),
      corridorHalfWidthM: needed(`/route/${i}/corridorHalfWidthM`, waypoint.corridor),
    })),
    wind: {
      source: words('/wind/source', draft.windSource),
      issuedAt: time('/wind/issuedAt', 'Issue time of the forecast', draft.windIssued),
      rows: draft.windRows.map((row, i) => ({
        time: time(`/wind/rows/${i}/time`, `Wind row ${i + 1}`, row.time),
        fromDeg: needed(`/wind/rows/${i}/fromDeg`, row.from),
        meanKn: needed(`/wind/rows/${i}/meanKn`, row.mean),
        gustKn: readOptionalNumber(row.gust),
      })),
    },
    streamRows: draft.streamRows.map((row, i) => ({
      time: time(`/streamRows/${i}/time`, `Stream row ${i + 1}`, row.time),
      towardDeg: needed(`/streamRows/${i}/towardDeg`, row.toward),
      kn: needed(`/streamRows/${i}/kn`, row.kn),
    })),
    limits: {
      meanKn: readOptionalNumber(limits.meanKn),
      gustKn: readOptionalNumber(limits.gustKn),
      loadShare: readOptionalNumber(limits.loadShare),
      shuntsPerHour: readOptionalNumber(limits.shuntsPerHour),
      hours: readOptionalNumber(limits.hours),
      afterDark: limits.afterDark === '' ? undefined : limits.afterDark === 'yes',
    },
  });
  if (parsed.success && problems.size === 0) return { plan: parsed.data, problems, missing };
  for (const { pointer, message } of parsed.success ? [] : flatten(parsed.error.issues)) {
    if (!problems.has(pointer)) problems.set(pointer, message);
  }
  if (draft.waypoints.length < 2) missing.add('/route');
  if (draft.windRows.length === 0) missing.add('/wind/rows');
  return { plan: null, problems, missing };
}

interface Issue {
  readonly path: readonly PropertyKey[];
  readonly message: string;
  readonly code?: string;
  readonly errors?: readonly (readonly Issue[])[];
}

/** A union hides its members' findings one level down (the stream is "no rows, or rows"): the fullest one's are shown. */
function flatten(issues: readonly Issue[], at: readonly PropertyKey[] = []): { pointer: string; message: string }[] {
  return issues.flatMap((issue) => {
    const path = [...at, ...issue.path];
    if (issue.code === 'invalid_union' && issue.errors) {
      const fullest = [...issue.errors].sort((a, b) => deepest(b) - deepest(a))[0];
      if (fullest && fullest.length > 0) return flatten(fullest, path);
    }
    return [{ pointer: toPointer(path), message: issue.message }];
  });
}

function deepest(issues: readonly Issue[]): number {
  return Math.max(0, ...issues.map((issue) => issue.path.length));
}

function messageFor(what: string, reading: ReturnType<typeof readTime>): string {
  if (reading.kind === 'problem') return `${what}: ${reading.message}`;
  if (reading.kind === 'which') {
    return `${what}: the clocks go back and this time happens twice. Choose which one is meant.`;
  }
  return `${what}: give a date and time, for example 2026-06-01 09:00.`;
}

export function isZone(zone: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return zone !== '';
  } catch {
    return false;
  }
}
