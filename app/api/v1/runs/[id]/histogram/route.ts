import { findRunHistogram } from '@/src/runs/find-run-histogram';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.getRunHistogram, ({ em, actor, params, query }) =>
  findRunHistogram(em, actor, params.id, query.by),
);
