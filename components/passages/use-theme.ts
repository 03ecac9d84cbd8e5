'use client';

import { useSyncExternalStore } from 'react';

type Theme = 'day' | 'night';

function subscribe(onChange: () => void): () => void {
  const observer = new MutationObserver(onChange);
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme'] });
  return () => observer.disconnect();
}

const read = (): Theme => (document.documentElement.dataset.theme === 'night' ? 'night' : 'day');

/** The theme that is set on the page, followed as it is switched. */
export function useTheme(): Theme {
  return useSyncExternalStore(subscribe, read, () => 'day');
}
