import { listRuns } from '@/src/runs/find-runs';
import { requestRun } from '@/src/runs/request-run';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.listRuns, ({ em, actor, query }) => listRuns(em, actor, query));

export const POST = route(contract.requestRun, ({ em, actor, body }) => requestRun(em, actor, body));
