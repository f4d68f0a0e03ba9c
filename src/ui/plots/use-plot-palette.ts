'use client';

import { useEffect, useState } from 'react';
import { screenPalette, type PlotPalette } from './plot-palette';

/** The palette of the theme on screen, read again whenever the theme class of the document changes. */
export function usePlotPalette(): PlotPalette | null {
  const [palette, setPalette] = useState<PlotPalette | null>(null);
  useEffect(() => {
    const read = () => setPalette(screenPalette());
    const watcher = new MutationObserver(read);
    watcher.observe(document.documentElement, { attributes: true, attributeFilter: ['class'] });
    read();
    return () => watcher.disconnect();
  }, []);
  return palette;
}
