import type { CheckState } from '@/lib/passages/passage';

/** Worst first. docs/model.md §7. */
export const STATES_WORST_FIRST: readonly CheckState[] = ['beyond', 'unknown', 'thin', 'within'];

/** The worst of several states; of none at all, not known. */
export function worstOf(states: readonly CheckState[]): CheckState {
  if (states.length === 0) return 'unknown';
  return STATES_WORST_FIRST.find((state) => states.includes(state)) ?? 'unknown';
}
