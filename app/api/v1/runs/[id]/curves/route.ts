import { findRunCurves } from '@/src/runs/find-run-curves';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.getRunCurves, ({ em, actor, params }) => findRunCurves(em, actor, params.id));
