import type { Layout, Shape } from 'plotly.js';
import { materialDashes, nthOf, type PlotPalette } from './plot-palette';
import { asLog, widestRangeUm, type RadiusRangeUm } from './radius-range';
import { cutoffsOf, type LabelStyle, type MaterialWindows } from './unbound-window';

type Marks = { shapes: Partial<Shape>[]; annotations: NonNullable<Layout['annotations']> };

const labelHeight = 0.062;

/** Where each material goes unbound: the windows as a faint wash, their ends as labelled lines with the material's dash. */
export function cutoffMarks(
  materials: readonly MaterialWindows[],
  rangeUm: RadiusRangeUm,
  style: LabelStyle,
  palette: PlotPalette,
): Marks {
  const cutoffs = cutoffsOf(materials, asLog(rangeUm), style);
  const lines: Partial<Shape>[] = cutoffs.map(({ radiusUm, material, level }) => ({
    type: 'line',
    yref: 'paper',
    x0: radiusUm,
    x1: radiusUm,
    y0: 0,
    y1: 1 + labelHeight * (level + 1),
    line: { color: nthOf(palette.materials, material), width: 1.5, dash: nthOf(materialDashes, material) },
  }));
  const annotations = cutoffs.map(({ radiusUm, label, material, level }) => ({
    x: Math.log10(radiusUm),
    yref: 'paper' as const,
    y: 1 + labelHeight * level,
    text: label,
    showarrow: false,
    xanchor: 'left' as const,
    yanchor: 'bottom' as const,
    xshift: 2,
    bgcolor: palette.paper,
    borderpad: 0,
    font: { size: 12, color: nthOf(palette.materials, material) },
  }));
  return { shapes: [...washes(materials, palette), ...lines], annotations };
}

function washes(materials: readonly MaterialWindows[], palette: PlotPalette): Partial<Shape>[] {
  const strength = Math.min(0.12, 0.24 / Math.max(1, materials.length));
  return materials.flatMap(({ unboundIntervalsUm }) =>
    unboundIntervalsUm.map(([low, high]) => ({
      type: 'rect' as const,
      layer: 'below' as const,
      yref: 'paper' as const,
      x0: low === 0 ? widestRangeUm[0] : low,
      x1: high ?? widestRangeUm[1],
      y0: 0,
      y1: 1,
      fillcolor: palette.unbound,
      opacity: strength,
      line: { width: 0 },
    })),
  );
}
