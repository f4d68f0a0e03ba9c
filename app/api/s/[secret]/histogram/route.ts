import { histogramOfRun } from '@/src/runs/find-run-histogram';
import { contract } from '@/src/web/contract';
import { sharedRoute } from '@/src/web/shared-route';

export const GET = sharedRoute({ query: contract.getRunHistogram.query }, async ({ run, query }) =>
  histogramOfRun(run, query.by),
);
