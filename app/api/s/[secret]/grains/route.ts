import { grainsOfRun } from '@/src/runs/find-run-grains';
import { grainQuery } from '@/src/runs/grain-query';
import { sharedRoute } from '@/src/web/shared-route';

export const GET = sharedRoute({ query: grainQuery }, ({ em, run, query }) => grainsOfRun(em, run, query));
