'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { MaterialItem } from '@/src/materials/schema';
import type { CurveAnswer } from '@/src/runs/schema';
import type { StarItem } from '@/src/stars/schema';
import { Notice } from '@/src/ui/notice';
import { apiPost, sayProblem, worthAskingAgain } from '@/src/ui/run-api';
import { useSettled } from '@/src/ui/run-settled';
import { CalculatorAnswer } from './calculator-answer';
import { CalculatorFields } from './calculator-fields';
import { requestOfCalculator } from './calculator-request';
import { useCalculatorText } from './use-calculator-text';

const askAfterMs = 350;

export function Calculator({ stars, materials }: { stars: readonly StarItem[]; materials: readonly MaterialItem[] }) {
  const [text, setText] = useCalculatorText(materials[0]?.slug ?? '', stars[0]?.slug ?? '');
  const { request, problems } = useMemo(() => requestOfCalculator(text), [text]);
  const asked = useSettled(request, askAfterMs);
  const { data, error, isFetching } = useQuery({
    queryKey: ['curve', asked],
    queryFn: ({ signal }) => apiPost<CurveAnswer>('/api/v1/curves', asked, signal),
    enabled: asked !== null,
    staleTime: Infinity,
    placeholderData: keepPreviousData,
    retry: worthAskingAgain,
  });
  const material = materials.find(({ slug }) => slug === text.material);
  return (
    <div className="grid items-start gap-8 lg:grid-cols-[20rem_minmax(0,1fr)]">
      <CalculatorFields text={text} problems={problems ?? {}} onChange={setText} stars={stars} materials={materials} />
      <div className="grid min-w-0 gap-4">
        {error !== null && <Notice kind="danger">{sayProblem(error)}</Notice>}
        <p role="status" className="text-muted min-h-5 text-sm">
          {problems ? 'Waiting for the fields at the side.' : isFetching ? 'Computing ...' : ''}
        </p>
        {data && material && <CalculatorAnswer answer={data} name={material.name} />}
      </div>
    </div>
  );
}
