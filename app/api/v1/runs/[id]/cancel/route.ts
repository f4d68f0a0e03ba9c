import { cancelRun } from '@/src/runs/cancel-run';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const POST = route(contract.cancelRun, ({ em, actor, params }) => cancelRun(em, actor, params.id));
