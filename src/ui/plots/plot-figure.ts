import type { Config, Data, Layout } from 'plotly.js';
import type { PlotPalette } from './plot-palette';

/** What to draw, for the palette it is drawn in. */
export type DrawFigure = (palette: PlotPalette) => { data: Data[]; layout: Partial<Layout> };

export type Figure = { data: Data[]; layout: Partial<Layout> };

export const plotConfig: Partial<Config> = { displayModeBar: false, doubleClick: false, scrollZoom: false };

const fontFamily = '"Instrument Sans Variable", "Instrument Sans", system-ui, sans-serif';

/** The look shared by all plots. On screen the key stands outside the drawing; a file carries its own. */
export function completeFigure(draw: DrawFigure, palette: PlotPalette, goal: 'screen' | 'file'): Figure {
  const { data, layout } = draw(palette);
  const axis = {
    gridcolor: palette.line,
    linecolor: palette.muted,
    tickcolor: palette.muted,
    zeroline: false,
    showline: true,
    ticks: 'outside',
    ticklen: 4,
    automargin: true,
  };
  return {
    data,
    layout: {
      autosize: true,
      paper_bgcolor: 'rgba(0,0,0,0)',
      plot_bgcolor: 'rgba(0,0,0,0)',
      font: { family: fontFamily, size: 13, color: palette.ink },
      margin: { l: 64, r: 16, t: 12, b: 48 },
      dragmode: 'zoom',
      hoverlabel: {
        bgcolor: palette.paper,
        bordercolor: palette.muted,
        font: { family: fontFamily, color: palette.ink },
      },
      legend: { orientation: 'h', x: 1, y: 1.02, xanchor: 'right', yanchor: 'bottom', bgcolor: 'rgba(0,0,0,0)' },
      ...layout,
      showlegend: goal === 'file',
      xaxis: { ...axis, ...layout.xaxis } as Layout['xaxis'],
      yaxis: { ...axis, ...layout.yaxis } as Layout['yaxis'],
    },
  };
}
