import type { Data } from 'plotly.js';
import type { RunHistogram } from '@/src/runs/schema';
import { cutoffMarks } from './cutoff-lines';
import type { DrawFigure } from './plot-figure';
import type { PlotPalette } from './plot-palette';
import type { PlotTable } from './plot-table';
import { plotMargin, radiusAxis } from './radius-axis';
import type { RadiusRangeUm } from './radius-range';
import type { LabelStyle, MaterialWindows } from './unbound-window';
import { weightWords } from './weights';

export type SizeDistribution = {
  histogram: RunHistogram;
  materials: readonly MaterialWindows[];
  rangeUm: RadiusRangeUm;
};

export function drawSizeDistribution(
  { histogram, materials, rangeUm }: SizeDistribution,
  style: LabelStyle,
): DrawFigure {
  return (palette) => ({
    data: [bars(histogram, 'bound', palette), bars(histogram, 'unbound', palette)],
    layout: {
      barmode: 'stack',
      bargap: 0,
      margin: { ...plotMargin, t: 100 },
      legend: {
        orientation: 'h',
        x: 1,
        y: 0.98,
        xanchor: 'right',
        yanchor: 'top',
        bgcolor: palette.paper,
        traceorder: 'reversed',
      },
      xaxis: radiusAxis(rangeUm),
      yaxis: { title: { text: `Share of ${weightWords[histogram.by]} (%)` }, rangemode: 'tozero', fixedrange: true },
      ...cutoffMarks(materials, rangeUm, style, palette),
    },
  });
}

function bars(histogram: RunHistogram, fate: 'bound' | 'unbound', palette: PlotPalette): Data {
  const bins = binsOf(histogram);
  const hatched =
    fate === 'unbound'
      ? {
          shape: '/' as const,
          fillmode: 'overlay' as const,
          fgcolor: palette.paper,
          fgopacity: 0.75,
          size: 7,
          solidity: 0.25,
        }
      : undefined;
  return {
    type: 'bar',
    name: fate === 'unbound' ? 'Unbound' : 'Bound',
    x: bins.map(({ lowUm, highUm }) => (lowUm + highUm) / 2),
    width: bins.map(({ lowUm, highUm }) => highUm - lowUm),
    y: bins.map((bin) => bin[fate] * 100),
    customdata: bins.map(({ lowUm, highUm }) => [lowUm, highUm]),
    hovertemplate: `%{customdata[0]:.3g} to %{customdata[1]:.3g} µm: %{y:.3g} % ${fate}<extra></extra>`,
    marker: { color: palette[fate], line: { color: palette.paper, width: 0.6 }, pattern: hatched },
  };
}

type Bin = { lowUm: number; highUm: number; unbound: number; bound: number };

/** Weights as shares of the whole population. */
export function binsOf({ edgesUm, unbound, bound }: RunHistogram): Bin[] {
  const whole = [...unbound, ...bound].reduce((sum, weight) => sum + weight, 0) || 1;
  return unbound.map((weight, index) => ({
    lowUm: edgesUm[index],
    highUm: edgesUm[index + 1],
    unbound: weight / whole,
    bound: bound[index] / whole,
  }));
}

export function sizeDistributionTable(histogram: RunHistogram): PlotTable {
  const unit = histogram.unit || undefined;
  return {
    columns: [
      { title: 'From', unit: 'µm' },
      { title: 'To', unit: 'µm' },
      { title: 'Unbound', unit: '%' },
      { title: 'Bound', unit: '%' },
      { title: 'Unbound, absolute', unit },
      { title: 'Bound, absolute', unit },
    ],
    rows: binsOf(histogram).map((bin, index) => [
      bin.lowUm,
      bin.highUm,
      bin.unbound * 100,
      bin.bound * 100,
      histogram.unbound[index],
      histogram.bound[index],
    ]),
  };
}
