import { findCatalogueGrains } from '@/src/catalogues/find-grains';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listCatalogueGrains, ({ em, actor, params, query }) =>
  findCatalogueGrains(em, actor, params.id, query),
);
