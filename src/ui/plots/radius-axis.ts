import type { LayoutAxis } from 'plotly.js';
import { asLog, type RadiusRangeUm } from './radius-range';
import { logTicks } from './radius-ticks';

/** The one radius axis of all plots, so that plots above each other line up. */
export function radiusAxis(rangeUm: RadiusRangeUm): Partial<LayoutAxis> {
  const range = asLog(rangeUm);
  const { values, labels } = logTicks(range);
  return {
    type: 'log',
    range,
    tickmode: 'array',
    tickvals: values,
    ticktext: labels,
    title: { text: 'Grain radius (µm)', standoff: 8 },
  };
}

/** Room on the left that no label of ours outgrows: equal margins keep the axes in line. */
export const plotMargin = { l: 68, r: 16, t: 12, b: 48 };
