import type { Metadata } from 'next';
import { may } from '@/src/access/policy';
import { env } from '@/src/env';
import { listMaterials } from '@/src/materials/find-materials';
import { Notice } from '@/src/ui/notice';
import { PageHeader } from '@/src/ui/page-header';
import { pageActor, pageEm } from '@/src/web/page';
import { UploadForm } from './upload-form';

export const metadata: Metadata = { title: 'New catalogue' };

const mebibyte = 1024 * 1024;

export default async function NewCataloguePage() {
  const actor = await pageActor();
  const { items: materials } = await listMaterials(await pageEm(), actor);
  return (
    <>
      <PageHeader
        title="New catalogue"
        subtitle="One row per grain: radius, diameter or mass with its unit, density, material, and one-sigma errors where you have them. The file is kept as it is."
      />
      {may(actor, 'catalogue.upload') ? (
        <UploadForm materials={materials} limitBytes={env().CHAFFLINE_UPLOAD_LIMIT_MB * mebibyte} />
      ) : (
        <Notice kind="info">Uploading is for researchers and the principal investigator of a group.</Notice>
      )}
    </>
  );
}
