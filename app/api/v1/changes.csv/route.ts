import { changesCsv } from '@/src/audit/find-changes';
import { contract } from '@/src/web/contract';
import { csvDownload } from '@/src/web/download';
import { route } from '@/src/web/route';

export const GET = route(contract.downloadChanges, async ({ em, actor, query }) =>
  csvDownload('changes', changesCsv(em, actor, query)),
);
