'use client';

import { useSyncExternalStore } from 'react';

const NONE: readonly string[] = ['UTC'];
let known: readonly string[] | null = null;

function zonesOfBrowser(): readonly string[] {
  known ??= ['UTC', ...Intl.supportedValuesOf('timeZone').filter((zone) => zone !== 'UTC')];
  return known;
}

const never = () => () => undefined;

/** The IANA zones this browser knows; on the server only UTC, so that both render the same at first. */
export function useZones(): readonly string[] {
  return useSyncExternalStore(never, zonesOfBrowser, () => NONE);
}
