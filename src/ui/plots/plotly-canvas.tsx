'use client';

import dynamic from 'next/dynamic';
import type { PlotParams } from 'react-plotly.js/factory';
import { PlotSkeleton } from './plot-skeleton';

/** Plotly itself, fetched only where a plot is shown (1.5 MB compressed). */
export const PlotlyCanvas = dynamic<PlotParams>(
  async () => {
    const [{ default: createPlotlyComponent }, { default: Plotly }] = await Promise.all([
      import('react-plotly.js/factory'),
      import('plotly.js-dist-min'),
    ]);
    return createPlotlyComponent(Plotly);
  },
  { ssr: false, loading: () => <PlotSkeleton /> },
);
