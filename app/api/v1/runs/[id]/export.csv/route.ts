import { exportRun } from '@/src/runs/export-run';
import { contract } from '@/src/web/contract';
import { csvDownload } from '@/src/web/download';
import { route } from '@/src/web/route';

export const GET = route(contract.exportRun, async ({ em, actor, params }) => {
  const { name, lines } = await exportRun(em, actor, params.id);
  return csvDownload(name, lines);
});
