import { z } from 'zod';
import { exportOfRun } from '@/src/runs/export-run';
import { csvDownload } from '@/src/web/download';
import { sharedRoute } from '@/src/web/shared-route';

export const GET = sharedRoute({ query: z.object({}), isDownload: true }, async ({ em, run }) => {
  const { name, lines } = exportOfRun(em, run);
  return csvDownload(name, lines);
});
