'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { parseAsStringLiteral, useQueryState } from 'nuqs';
import { useMemo } from 'react';
import type { RunSummary } from '@/entities/run-summary';
import type { RunCurves, RunHistogram, RunItem } from '@/src/runs/schema';
import { Notice } from './notice';
import { BetaCurvePlot } from './plots/beta-curve';
import { PlotSkeleton } from './plots/plot-skeleton';
import { RadiusRangeControl } from './plots/radius-range-control';
import { SizeDistributionPlot } from './plots/size-distribution';
import { useRadiusRange } from './plots/use-radius-range';
import { WeightSwitch } from './plots/weight-switch';
import { weights } from './plots/weights';
import { apiGet, sayProblem } from './run-api';
import { radiiOfInterest } from './run-radii';
import { useRunSource } from './run-source';
import { RunSection } from './run-section';

export function RunPlots({ run, summary }: { run: RunItem; summary: RunSummary }) {
  const { base } = useRunSource(run.id);
  const [by, setBy] = useQueryState('by', parseAsStringLiteral(weights).withDefault('number'));
  const histogram = useQuery({
    queryKey: ['histogram', base, by],
    queryFn: ({ signal }) => apiGet<RunHistogram>(`${base}/histogram?by=${by}`, signal),
    staleTime: Infinity,
    placeholderData: keepPreviousData,
  });
  const curves = useQuery({
    queryKey: ['curves', base],
    queryFn: ({ signal }) => apiGet<RunCurves>(`${base}/curves`, signal),
    staleTime: Infinity,
  });
  const whole = useMemo(() => radiiOfInterest(summary, histogram.data), [summary, histogram.data]);
  const { rangeUm, isZoomed, choose, zoom } = useRadiusRange(whole);
  const betaCurves = useMemo(() => withWindows(curves.data, summary), [curves.data, summary]);
  const problem = histogram.error ?? curves.error;
  return (
    <RunSection id="plots" title="Sizes and beta">
      <div className="mb-3">
        <RadiusRangeControl rangeUm={rangeUm} isZoomed={isZoomed} onChoose={choose} />
      </div>
      {problem && <Notice kind="danger">{sayProblem(problem)}</Notice>}
      <div className="grid gap-8">
        {histogram.data ? (
          <SizeDistributionPlot
            histogram={histogram.data}
            materials={summary.perMaterial}
            rangeUm={rangeUm}
            fileName={`size-distribution-${run.id.slice(0, 8)}`}
            onZoomX={zoom}
            controls={<WeightSwitch value={by} onChange={setBy} />}
          />
        ) : (
          <div className="h-96">
            <PlotSkeleton />
          </div>
        )}
        {curves.data && (
          <BetaCurvePlot
            curves={betaCurves}
            betaCritical={summary.betaCritical}
            rangeUm={rangeUm}
            fileName={`beta-${run.id.slice(0, 8)}`}
            onZoomX={zoom}
            height="h-96"
            caption="At the mean density of each material. At or above the dashed line grains leave; the thick part of a curve is its unbound radii, markers are its ends. Drag across either plot to look closer."
          />
        )}
      </div>
    </RunSection>
  );
}

function withWindows(curves: RunCurves | undefined, { perMaterial }: RunSummary) {
  return (curves?.curves ?? []).map((curve) => ({
    ...curve,
    unboundIntervalsUm: perMaterial.find(({ material }) => material === curve.material)?.unboundIntervalsUm ?? [],
  }));
}
