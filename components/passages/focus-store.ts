import type { Position } from '@/lib/geo/position';

/** The place that is looked at on the strip, beside the page's state: a hover then moves the map's ring and nothing else. */
export interface FocusStore {
  readonly get: () => Position | null;
  readonly set: (place: Position | null) => void;
  readonly subscribe: (onChange: () => void) => () => void;
}

/** A pointer moves faster than a map is drawn: only where it rests this long is passed on, ms. */
const REST_MS = 60;

export function createFocusStore(): FocusStore {
  let place: Position | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const listeners = new Set<() => void>();
  return {
    get: () => place,
    set: (next) => {
      clearTimeout(timer);
      timer = setTimeout(() => {
        place = next;
        for (const listener of listeners) listener();
      }, REST_MS);
    },
    subscribe: (onChange) => {
      listeners.add(onChange);
      return () => listeners.delete(onChange);
    },
  };
}
