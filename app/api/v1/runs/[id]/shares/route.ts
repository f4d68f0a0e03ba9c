import { listShares } from '@/src/sharing/find-shares';
import { makeShare } from '@/src/sharing/make-share';
import { contract } from '@/src/web/contract';
import { publicUrl } from '@/src/web/public-url';
import { route } from '@/src/web/route';

export const GET = route(contract.listShares, ({ em, actor, params }) => listShares(em, actor, params.id));

export const POST = route(contract.makeShare, async ({ em, actor, params, body }) => {
  const { id, secret, expiresAt } = await makeShare(em, actor, params.id, body);
  return { id, url: publicUrl(`/s/${secret}`), expiresAt: expiresAt.toISOString() };
});
