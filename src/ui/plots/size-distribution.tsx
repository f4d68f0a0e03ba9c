'use client';

import { useMemo } from 'react';
import type { RunHistogram } from '@/src/runs/schema';
import { percentText, trimmed } from '@/src/ui/run-figures';
import { binsOf, drawSizeDistribution, sizeDistributionTable, type SizeDistribution } from './draw-size-distribution';
import { Plot, type PlotProps } from './plot';
import type { KeyEntry } from './plot-key';
import type { MaterialWindows } from './unbound-window';
import { useIsNarrow } from './use-is-narrow';
import { weightWords } from './weights';

type Props = SizeDistribution & { fileName: string } & Pick<PlotProps, 'controls' | 'onZoomX'>;

export function SizeDistributionPlot({ histogram, materials, rangeUm, fileName, controls, onZoomX }: Props) {
  const style = useIsNarrow() ? 'short' : 'full';
  const draw = useMemo(
    () => drawSizeDistribution({ histogram, materials, rangeUm }, style),
    [histogram, materials, rangeUm, style],
  );
  const table = useMemo(() => sizeDistributionTable(histogram), [histogram]);
  return (
    <Plot
      title={`Size distribution by ${weightWords[histogram.by]}`}
      summary={summaryOf(histogram)}
      caption="Bars are stacked: hatched is unbound, plain is bound. Tinted radii are unbound for a material; the lines are the ends of its window, in µm."
      draw={draw}
      table={table}
      fileName={`${fileName}-${histogram.by}`}
      height="h-96"
      controls={controls}
      keyEntries={[...fates, ...materials.flatMap(lineEntries)]}
      onZoomX={onZoomX}
    />
  );
}

const fates: KeyEntry[] = [
  { label: 'Unbound', sample: { bar: 'unbound' } },
  { label: 'Bound', sample: { bar: 'bound' } },
];

/** A material that is never unbound has no line. */
const lineEntries = ({ name, unboundIntervalsUm }: MaterialWindows, line: number): KeyEntry[] =>
  unboundIntervalsUm.length > 0 ? [{ label: name, sample: { line } }] : [];

function summaryOf(histogram: RunHistogram): string {
  const bins = binsOf(histogram);
  if (bins.length === 0) return 'No grains.';
  const unbound = bins.reduce((sum, bin) => sum + bin.unbound, 0);
  const fullest = bins.reduce((best, bin) => (bin.unbound + bin.bound > best.unbound + best.bound ? bin : best));
  const weight = weightWords[histogram.by];
  return (
    `Stacked bars of the ${weight} of grains over radius from ${trimmed(bins[0].lowUm)} to ${trimmed(bins[bins.length - 1].highUm)} µm, split by fate. ` +
    `${percentText(unbound)} of the ${weight} is unbound; the fullest bin lies between ${trimmed(fullest.lowUm)} and ${trimmed(fullest.highUm)} µm.`
  );
}
