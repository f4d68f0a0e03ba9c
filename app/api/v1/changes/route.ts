import { findChanges } from '@/src/audit/find-changes';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listChanges, ({ em, actor, query: { after, ...search } }) =>
  findChanges(em, actor, search, after),
);
