import type { CheckState } from '@/lib/passages/passage';

/** The four states in words. */
export const STATE_WORDS: Readonly<Record<CheckState, string>> = {
  within: 'within limits',
  thin: 'little margin',
  beyond: 'beyond righting moment',
  unknown: 'not known',
};
