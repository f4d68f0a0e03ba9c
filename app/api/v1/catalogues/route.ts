import { join } from 'node:path';
import { receiveCatalogue } from '@/src/catalogues/receive-catalogue';
import { readUploadForm, uploadFields } from '@/src/catalogues/upload-form';
import { listCatalogues } from '@/src/catalogues/find-catalogues';
import { demand } from '@/src/access/policy';
import { env } from '@/src/env';
import { contract } from '@/src/web/contract';
import { refusalOfZod } from '@/src/web/problem';
import { route } from '@/src/web/route';

const mebibyte = 1024 * 1024;

export const GET = route(contract.listCatalogues, ({ em, actor, query }) => listCatalogues(em, actor, query));

export const POST = route(contract.uploadCatalogue, async ({ em, actor, request }) => {
  demand(actor, 'catalogue.upload');
  const { CHAFFLINE_UPLOAD_LIMIT_MB, CHAFFLINE_STATE_DIR } = env();
  const spoolRules = {
    directory: join(CHAFFLINE_STATE_DIR, 'uploads'),
    limitBytes: CHAFFLINE_UPLOAD_LIMIT_MB * mebibyte,
  };
  const form = await readUploadForm(request.body, request.headers.get('content-type'), spoolRules);
  try {
    const fields = uploadFields.safeParse(form.fields);
    if (!fields.success) throw refusalOfZod(fields.error, 'form');
    const { name, mapping = null, defaults = {}, onInvalidRows } = fields.data;
    return await receiveCatalogue(em, actor, {
      file: form.file,
      fileName: form.fileName,
      name,
      mapping,
      defaults,
      onInvalidRows,
    });
  } finally {
    await form.file.remove();
  }
});
