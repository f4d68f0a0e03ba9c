import { impactCsv } from '@/src/runs/impact-csv';
import { contract } from '@/src/web/contract';
import { csvDownload } from '@/src/web/download';
import { route } from '@/src/web/route';

export const GET = route(contract.downloadImpact, async ({ em, actor, params }) =>
  csvDownload('impact', await impactCsv(em, actor, params.id)),
);
