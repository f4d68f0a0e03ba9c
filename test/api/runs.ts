import { POST } from '@/app/api/v1/runs/route';
import { GET } from '@/app/api/v1/runs/[id]/route';
import { forkEm } from '@/src/db';
import { executeRun } from '@/src/runs/execute-run';
import type { RunItem } from '@/src/runs/schema';
import { call, json } from './call';
import type { Member } from './people';

export const circular = { distanceAu: 1, eccentricity: 0, at: 'pericentre' } as const;

/** Requests a run and does the worker's part at once. */
export async function ran(member: Member, request: object): Promise<RunItem> {
  const { id } = await json<{ id: string }>(call(POST, { as: member, json: request }), 202);
  await executeRun(await forkEm(), id);
  return json<RunItem>(call(GET, { as: member, params: { id } }));
}
