'use client';

import { useMemo, type ReactNode } from 'react';
import { completeFigure, plotConfig, type DrawFigure } from './plot-figure';
import { PlotDataTable } from './plot-data-table';
import { PlotDownloads } from './plot-downloads';
import { PlotKey, type KeyEntry } from './plot-key';
import { PlotSkeleton } from './plot-skeleton';
import type { PlotTable } from './plot-table';
import { PlotlyCanvas } from './plotly-canvas';
import { axisRange, type LogRange } from './radius-ticks';
import { usePlotPalette } from './use-plot-palette';

export type PlotProps = {
  title: string;
  /** What the picture shows, for those who do not see it. */
  summary: string;
  caption: ReactNode;
  draw: DrawFigure;
  table: PlotTable;
  fileName: string;
  /** Fixed, so that nothing jumps when the plot arrives. */
  height?: 'h-56' | 'h-72' | 'h-80' | 'h-96';
  controls?: ReactNode;
  keyEntries: readonly KeyEntry[];
  onZoomX?: (range: LogRange) => void;
};

export function Plot({
  title,
  summary,
  caption,
  draw,
  table,
  fileName,
  height = 'h-80',
  controls,
  keyEntries,
  onZoomX,
}: PlotProps) {
  const palette = usePlotPalette();
  const figure = useMemo(() => palette && completeFigure(draw, palette, 'screen'), [draw, palette]);
  const zoomed = (event: unknown) => {
    const range = axisRange(event);
    if (range && onZoomX) onZoomX(range);
  };
  return (
    <figure className="min-w-0">
      <div className="mb-1 flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
        <p className="font-serif text-lg">{title}</p>
        {controls}
      </div>
      <PlotKey entries={keyEntries} palette={palette} />
      <div className={`${height} w-full`} role="img" aria-label={summary}>
        {figure ? (
          <PlotlyCanvas
            data={figure.data}
            layout={figure.layout}
            config={plotConfig}
            className="h-full w-full"
            useResizeHandler
            onRelayout={zoomed}
          />
        ) : (
          <PlotSkeleton />
        )}
      </div>
      <figcaption className="text-muted text-sm">{caption}</figcaption>
      <div className="mt-1 flex flex-wrap items-start justify-between gap-2">
        <PlotDataTable table={table} title={title} />
        <PlotDownloads draw={draw} table={table} title={title} fileName={fileName} />
      </div>
    </figure>
  );
}
