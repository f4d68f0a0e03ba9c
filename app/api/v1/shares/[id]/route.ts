import { revokeShare } from '@/src/sharing/revoke-share';
import { contract } from '@/src/web/contract';
import { route } from '@/src/web/route';

export const DELETE = route(contract.revokeShare, ({ em, actor, params }) => revokeShare(em, actor, params.id));
