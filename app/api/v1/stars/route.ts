import { listStars } from '@/src/stars/find-stars';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listStars, ({ em, actor }) => listStars(em, actor));
