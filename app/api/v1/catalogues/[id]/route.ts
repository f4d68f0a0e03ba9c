import { findCatalogue } from '@/src/catalogues/find-catalogues';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.getCatalogue, ({ em, actor, params }) => findCatalogue(em, actor, params.id));
