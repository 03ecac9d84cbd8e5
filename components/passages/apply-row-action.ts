import type { PlanAction } from './plan-actions';
import { NO_TIME, type PlanDraft, type StreamRowDraft, type WindRowDraft } from './plan-draft';
import { readTime, timeToDraft } from './read-time';

type RowAction = Extract<
  PlanAction,
  {
    type:
      | 'addWindRow'
      | 'setWindRow'
      | 'setWindTime'
      | 'deleteWindRow'
      | 'putWindRows'
      | 'useForecast'
      | 'addStreamRow'
      | 'setStreamRow'
      | 'setStreamTime'
      | 'deleteStreamRow'
      | 'putStreamRows';
  }
>;

const HOUR_MS = 3_600_000;

/** Changes of the wind and stream tables. */
export function applyRowAction(draft: PlanDraft, action: RowAction): PlanDraft {
  switch (action.type) {
    case 'addWindRow': {
      const row = { time: timeAfter(draft, draft.windRows), from: '', mean: '', gust: '' };
      return putWind(draft, [row], false);
    }
    case 'setWindRow':
      return mendWind(draft, action.id, { [action.field]: action.value });
    case 'setWindTime':
      return mendWind(draft, action.id, { time: action.value });
    case 'deleteWindRow':
      return { ...draft, windRows: draft.windRows.filter((row) => row.id !== action.id) };
    case 'putWindRows':
      return putWind(draft, action.rows, action.replace);
    case 'useForecast':
      return {
        ...putWind(draft, action.rows, true),
        windSource: action.source,
        windIssued: action.issued,
      };
    case 'addStreamRow':
      return putStream(draft, [{ time: timeAfter(draft, draft.streamRows), toward: '', kn: '' }], false);
    case 'setStreamRow':
      return mendStream(draft, action.id, { [action.field]: action.value });
    case 'setStreamTime':
      return mendStream(draft, action.id, { time: action.value });
    case 'deleteStreamRow':
      return { ...draft, streamRows: draft.streamRows.filter((row) => row.id !== action.id) };
    case 'putStreamRows':
      return putStream(draft, action.rows, action.replace);
  }
}

function putWind(draft: PlanDraft, rows: readonly Omit<WindRowDraft, 'id'>[], replace: boolean): PlanDraft {
  const added = rows.map((row, i) => ({ ...row, id: `n${draft.nextId + i}` }));
  return {
    ...draft,
    windRows: replace ? added : [...draft.windRows, ...added],
    nextId: draft.nextId + added.length,
  };
}

function putStream(draft: PlanDraft, rows: readonly Omit<StreamRowDraft, 'id'>[], replace: boolean): PlanDraft {
  const added = rows.map((row, i) => ({ ...row, id: `n${draft.nextId + i}` }));
  return {
    ...draft,
    streamRows: replace ? added : [...draft.streamRows, ...added],
    nextId: draft.nextId + added.length,
  };
}

function mendWind(draft: PlanDraft, id: string, change: Partial<WindRowDraft>): PlanDraft {
  return { ...draft, windRows: draft.windRows.map((row) => (row.id === id ? { ...row, ...change } : row)) };
}

function mendStream(draft: PlanDraft, id: string, change: Partial<StreamRowDraft>): PlanDraft {
  return { ...draft, streamRows: draft.streamRows.map((row) => (row.id === id ? { ...row, ...change } : row)) };
}

/** A new row starts three hours after the last, the first one at the departure: only a first guess to type over. */
function timeAfter(draft: PlanDraft, rows: readonly { readonly time: WindRowDraft['time'] }[]) {
  const last = rows[rows.length - 1];
  const reading = readTime(last?.time ?? draft.departure, draft.zone);
  if (reading.kind !== 'instant') return NO_TIME;
  return timeToDraft(reading.epochMs + (last ? 3 * HOUR_MS : 0), draft.zone);
}
