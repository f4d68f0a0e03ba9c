import { findRun } from '@/src/runs/find-runs';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const GET = route(contract.getRun, ({ em, actor, params }) => findRun(em, actor, params.id));
