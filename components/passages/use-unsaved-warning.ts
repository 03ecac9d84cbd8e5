'use client';

import { useEffect } from 'react';

const QUESTION = 'Changes on this page are not saved. Leave and lose them?';

/** Asks before the page is left with unsaved changes, by the browser or by a link of our own. */
export function useUnsavedWarning(unsaved: boolean): void {
  useEffect(() => {
    if (!unsaved) return;
    const onLeave = (event: BeforeUnloadEvent) => event.preventDefault();
    const onClick = (event: MouseEvent) => {
      const link = (event.target as Element | null)?.closest?.('a[href]');
      if (!link || link.getAttribute('target') === '_blank' || event.metaKey || event.ctrlKey) return;
      if (link.getAttribute('href')?.startsWith('#')) return;
      if (window.confirm(QUESTION)) return;
      event.preventDefault();
      event.stopPropagation();
    };
    window.addEventListener('beforeunload', onLeave);
    document.addEventListener('click', onClick, true);
    return () => {
      window.removeEventListener('beforeunload', onLeave);
      document.removeEventListener('click', onClick, true);
    };
  }, [unsaved]);
}
