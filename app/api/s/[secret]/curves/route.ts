import { z } from 'zod';
import { curvesOfRun } from '@/src/runs/find-run-curves';
import { sharedRoute } from '@/src/web/shared-route';

export const GET = sharedRoute({ query: z.object({}) }, ({ em, run }) => curvesOfRun(em, run));
