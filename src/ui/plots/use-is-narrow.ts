'use client';

import { useSyncExternalStore } from 'react';

const narrow = '(max-width: 640px)';

function watch(onChange: () => void): () => void {
  const query = window.matchMedia(narrow);
  query.addEventListener('change', onChange);
  return () => query.removeEventListener('change', onChange);
}

/** Whether there is too little room for long labels inside a plot. */
export function useIsNarrow(): boolean {
  return useSyncExternalStore(
    watch,
    () => window.matchMedia(narrow).matches,
    () => false,
  );
}
