import { POST } from '@/app/api/v1/catalogues/route';
import { GET } from '@/app/api/v1/catalogues/[id]/route';
import { checkCatalogue } from '@/src/catalogues/check-catalogue';
import type { CatalogueItem } from '@/src/catalogues/schema';
import { forkEm } from '@/src/db';
import { call, json } from './call';
import type { Member } from './people';

type Upload = {
  name?: string;
  file?: string | Uint8Array<ArrayBuffer>;
  mapping?: object;
  defaults?: object;
  onInvalidRows?: string;
};

export function uploadForm({
  name = 'A catalogue',
  file = 'radius_um,density_g_cm3,material\n1,2.5,astrosil\n',
  ...json
}: Upload = {}): FormData {
  const form = new FormData();
  form.set('name', name);
  for (const [key, value] of Object.entries(json))
    form.set(key, typeof value === 'string' ? value : JSON.stringify(value));
  form.set('file', new Blob([file]), 'grains.csv');
  return form;
}

/** Uploads as a person would and does the worker's part at once. */
export async function uploaded(member: Member, upload: Upload = {}): Promise<CatalogueItem> {
  const { id } = await json<{ id: string }>(call(POST, { as: member, form: uploadForm(upload) }), 202);
  await checkCatalogue(await forkEm(), id, { maxRows: 100_000 });
  return json<CatalogueItem>(call(GET, { as: member, params: { id } }));
}
