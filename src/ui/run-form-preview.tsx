'use client';

import { useQueries, type UseQueryResult } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import type { CatalogueItem } from '@/src/catalogues/schema';
import type { MaterialItem } from '@/src/materials/schema';
import type { RunRequest } from '@/src/runs/request-schema';
import type { CurveAnswer } from '@/src/runs/schema';
import { BetaCurvePlot } from './plots/beta-curve';
import { rangeAround } from './plots/radius-range';
import { materialSentence } from './run-answer';
import { apiPost, sayProblem, worthAskingAgain } from './run-api';

type Props = {
  request: RunRequest;
  betaCritical: number;
  catalogue: CatalogueItem;
  materials: readonly MaterialItem[];
};

/** The answer in outline, before anything is stored: each material of the catalogue at its own density. */
export function RunFormPreview({ request, betaCritical, catalogue, materials }: Props) {
  const slugs = catalogue.materials.map(({ material }) => material);
  const combine = useCallback(
    (results: UseQueryResult<CurveAnswer>[]) => combined(results, catalogue, materials),
    [catalogue, materials],
  );
  const { curves, problem, isBusy } = useQueries({
    queries: slugs.map((slug) => curveQuery(request, slug, betaCritical)),
    combine,
  });
  const rangeUm = useMemo(() => rangeAround(curves.flatMap(radiiToSee)), [curves]);
  return (
    <div className="grid gap-3">
      <div role="status" className="grid gap-1">
        {curves.map((curve) => (
          <p key={curve.name} className="font-serif text-lg">
            {materialSentence(curve)}
          </p>
        ))}
        {isBusy && <p className="text-muted text-sm">Computing curves ...</p>}
      </div>
      {problem && (
        <p role="alert" className="text-danger text-sm">
          {sayProblem(problem)}
        </p>
      )}
      {curves.length > 0 && (
        <BetaCurvePlot
          curves={curves}
          betaCritical={betaCritical}
          rangeUm={rangeUm}
          fileName="beta-preview"
          height="h-72"
          caption="Each material at its own density; the run judges every grain at the density in the catalogue."
        />
      )}
    </div>
  );
}

/** The query client keeps this the same object while the answers stay the same, so the plot is drawn only when they change. */
function combined(
  results: UseQueryResult<CurveAnswer>[],
  catalogue: CatalogueItem,
  materials: readonly MaterialItem[],
) {
  const names = catalogue.materials.map(
    ({ material }) => materials.find(({ slug }) => slug === material)?.name ?? material,
  );
  return {
    curves: results.flatMap(({ data }, index) => (data ? [{ name: names[index], ...data }] : [])),
    problem: results.find(({ error }) => error)?.error,
    isBusy: results.some(({ isFetching }) => isFetching),
  };
}

function curveQuery(request: RunRequest, slug: string, betaCritical: number) {
  const body = {
    slug,
    starSlug: request.starSlug,
    starId: request.starId,
    star: request.star,
    betaCritical,
    optics: request.optics,
  };
  return {
    queryKey: ['curve', body],
    queryFn: ({ signal }: { signal: AbortSignal }) => apiPost<CurveAnswer>('/api/v1/curves', body, signal),
    staleTime: Infinity,
    retry: worthAskingAgain,
  };
}

/** Around the window and the peak, and at least from 0.01 to 100 um. */
const radiiToSee = ({ unboundIntervalsUm, radiusAtBetaMaxUm }: CurveAnswer) =>
  [...unboundIntervalsUm.flat(), radiusAtBetaMaxUm, 0.02, 50].filter((radius): radius is number => radius !== null);
