import { rejectsCsv } from '@/src/catalogues/find-rejects';
import { contract } from '@/src/web/contract';
import { csvDownload } from '@/src/web/download';
import { route } from '@/src/web/route';

export const GET = route(contract.downloadRejects, async ({ em, actor, params }) => {
  const { name, lines } = await rejectsCsv(em, actor, params.id);
  return csvDownload(`${name}, rejected rows`, lines);
});
