'use client';

import { useEffect, useRef, useState, type RefObject } from 'react';

/** The width an element has, px; the usual one until it is measured. */
export function useRoomPx(usualPx: number): readonly [RefObject<HTMLDivElement | null>, number] {
  const ref = useRef<HTMLDivElement | null>(null);
  const [px, setPx] = useState(usualPx);
  useEffect(() => {
    const element = ref.current;
    if (!element || typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(() => setPx(Math.floor(element.clientWidth)));
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, px];
}
