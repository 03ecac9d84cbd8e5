'use client';

import { useSyncExternalStore } from 'react';

const never = () => () => undefined;

/** Whether the page's script runs: before that, what is typed into a field would be lost. */
export function useReady(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
