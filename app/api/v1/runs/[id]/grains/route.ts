import { findRunGrains } from '@/src/runs/find-run-grains';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listRunGrains, ({ em, actor, params, query }) =>
  findRunGrains(em, actor, params.id, query),
);
