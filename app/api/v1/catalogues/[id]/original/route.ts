import { readOriginal } from '@/src/catalogues/read-original';
import { contract } from '@/src/web/contract';
import { download } from '@/src/web/download';
import { route } from '@/src/web/route';

export const GET = route(contract.downloadOriginal, async ({ em, actor, params }) => {
  const { fileName, byteSize, sha256, bytes } = await readOriginal(em, actor, params.id);
  const digest = Buffer.from(sha256, 'hex').toString('base64');
  return download(fileName, 'application/octet-stream', bytes, {
    'content-length': String(byteSize),
    'content-digest': `sha-256=:${digest}:`,
  });
});
