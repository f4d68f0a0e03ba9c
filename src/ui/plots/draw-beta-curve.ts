import type { Data } from 'plotly.js';
import { exactText } from '@/src/ui/run-figures';
import type { DrawFigure } from './plot-figure';
import { materialDashes, nthOf, type PlotPalette } from './plot-palette';
import type { PlotTable } from './plot-table';
import { decadeTicks } from './decade-ticks';
import { plotMargin, radiusAxis } from './radius-axis';
import type { RadiusRangeUm } from './radius-range';

export type BetaCurve = {
  name: string;
  radiiUm: readonly number[];
  qpr: readonly number[];
  beta: readonly number[];
  unboundIntervalsUm: readonly (readonly [number, number | null])[];
};

/** Beta over radius, one dash per material; the part at or above the critical value is drawn strong, its ends marked. */
export function drawBetaCurve(curves: readonly BetaCurve[], betaCritical: number, rangeUm: RadiusRangeUm): DrawFigure {
  return (palette) => ({
    data: curves.flatMap((curve, index) => [
      line(curve, index, palette),
      strong(curve, index, betaCritical, palette),
      ends(curve, index, betaCritical, palette),
    ]),
    layout: {
      margin: plotMargin,
      hovermode: 'closest',
      xaxis: radiusAxis(rangeUm),
      yaxis: {
        type: 'log',
        title: { text: 'β' },
        range: betaRange(curves, betaCritical, rangeUm),
        ...decadeTicks(betaRange(curves, betaCritical, rangeUm)),
        fixedrange: true,
      },
      shapes: [
        {
          type: 'line',
          xref: 'paper',
          x0: 0,
          x1: 1,
          y0: betaCritical,
          y1: betaCritical,
          line: { color: palette.unbound, width: 1.5, dash: 'dash' },
        },
      ],
      annotations: [
        {
          xref: 'paper',
          x: 1,
          y: Math.log10(betaCritical),
          text: `critical β = ${exactText(betaCritical, 4)}`,
          showarrow: false,
          xanchor: 'right',
          yanchor: 'bottom',
          font: { size: 12, color: palette.unbound },
        },
      ],
    },
  });
}

function line({ name, radiiUm, beta, qpr }: BetaCurve, index: number, palette: PlotPalette): Data {
  return {
    type: 'scatter',
    mode: 'lines',
    name,
    legendgroup: name,
    x: [...radiiUm],
    y: [...beta],
    customdata: [...qpr],
    hovertemplate: `${name}<br>%{x:.3g} µm: β %{y:.3g}, Q_pr %{customdata:.3g}<extra></extra>`,
    line: { color: nthOf(palette.materials, index), width: 2, dash: nthOf(materialDashes, index) },
  };
}

function strong({ name, radiiUm, beta }: BetaCurve, index: number, betaCritical: number, palette: PlotPalette): Data {
  return {
    type: 'scatter',
    mode: 'lines',
    legendgroup: name,
    showlegend: false,
    hoverinfo: 'skip',
    connectgaps: false,
    x: [...radiiUm],
    y: beta.map((value) => (value >= betaCritical ? value : null)),
    line: { color: nthOf(palette.materials, index), width: 5 },
    opacity: 0.45,
  };
}

const endSymbols = ['circle', 'diamond', 'square', 'triangle-up', 'cross', 'star'] as const;

function ends(
  { name, unboundIntervalsUm }: BetaCurve,
  index: number,
  betaCritical: number,
  palette: PlotPalette,
): Data {
  const radii = unboundIntervalsUm.flat().filter((radius): radius is number => radius !== null && radius > 0);
  return {
    type: 'scatter',
    mode: 'markers',
    legendgroup: name,
    showlegend: false,
    x: radii,
    y: radii.map(() => betaCritical),
    hovertemplate: `${name}: critical at %{x:.4g} µm<extra></extra>`,
    marker: {
      symbol: nthOf(endSymbols, index),
      size: 10,
      color: nthOf(palette.materials, index),
      line: { color: palette.paper, width: 1.5 },
    },
  };
}

/** As powers of ten: what is in view, never without the critical value. */
export function betaRange(
  curves: readonly BetaCurve[],
  betaCritical: number,
  [lowUm, highUm]: RadiusRangeUm,
): [number, number] {
  const seen = curves.flatMap(({ radiiUm, beta }) =>
    beta.filter((value, index) => value > 0 && radiiUm[index] >= lowUm && radiiUm[index] <= highUm),
  );
  const top = Math.max(betaCritical, ...seen) * 1.6;
  const bottom = Math.min(betaCritical, ...seen) / 1.6;
  return [Math.log10(Math.max(bottom, top * 1e-5)), Math.log10(top)];
}

/** One row per material and radius. */
export function betaCurveTable(curves: readonly BetaCurve[]): PlotTable {
  return {
    columns: [{ title: 'Material' }, { title: 'Radius', unit: 'µm' }, { title: 'Q_pr' }, { title: 'Beta' }],
    rows: curves.flatMap(({ name, radiiUm, qpr, beta }) =>
      radiiUm.map((radius, index) => [name, radius, qpr[index], beta[index]]),
    ),
  };
}
