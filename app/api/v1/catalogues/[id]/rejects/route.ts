import { listRejects } from '@/src/catalogues/find-rejects';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listRejects, ({ em, actor, params, query }) =>
  listRejects(em, actor, params.id, query),
);
