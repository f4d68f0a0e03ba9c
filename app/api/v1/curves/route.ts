import { computeCurve } from '@/src/runs/compute-curve';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const POST = route(contract.computeCurve, ({ em, actor, body }) => computeCurve(em, actor, body));
