'use client';

import { useSyncExternalStore } from 'react';

const never = () => () => undefined;

/** The zone of this device; UTC until the page runs in the browser. */
export function useOwnZone(): string {
  return useSyncExternalStore(
    never,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone || 'UTC',
    () => 'UTC',
  );
}
