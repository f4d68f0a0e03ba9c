'use client';

import { useMemo } from 'react';
import { intervalsInWords } from '@/src/ui/run-answer';
import { exactText } from '@/src/ui/run-figures';
import { betaCurveTable, drawBetaCurve, type BetaCurve } from './draw-beta-curve';
import { Plot, type PlotProps } from './plot';
import type { RadiusRangeUm } from './radius-range';

type Props = {
  curves: readonly BetaCurve[];
  betaCritical: number;
  rangeUm: RadiusRangeUm;
  fileName: string;
} & Pick<PlotProps, 'height' | 'onZoomX' | 'caption'>;

export function BetaCurvePlot({ curves, betaCritical, rangeUm, fileName, height, onZoomX, caption }: Props) {
  const draw = useMemo(() => drawBetaCurve(curves, betaCritical, rangeUm), [curves, betaCritical, rangeUm]);
  const table = useMemo(() => betaCurveTable(curves), [curves]);
  const summary = `Beta over grain radius, both logarithmic. Critical beta ${exactText(betaCritical, 4)}. ${curves.map(unboundWords).join(' ')}`;
  return (
    <Plot
      title="Beta over radius"
      summary={summary}
      caption={caption}
      draw={draw}
      table={table}
      fileName={fileName}
      height={height}
      keyEntries={curves.map(({ name }, line) => ({ label: name, sample: { line } }))}
      onZoomX={onZoomX}
    />
  );
}

const unboundWords = ({ name, unboundIntervalsUm }: BetaCurve) =>
  `${name}: unbound ${intervalsInWords(unboundIntervalsUm)}.`;
