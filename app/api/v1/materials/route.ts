import { listMaterials } from '@/src/materials/find-materials';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listMaterials, ({ em, actor }) => listMaterials(em, actor));
