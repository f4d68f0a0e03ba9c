import type { Metadata } from 'next';
import { listMaterials } from '@/src/materials/find-materials';
import { listStars } from '@/src/stars/find-stars';
import { PageHeader } from '@/src/ui/page-header';
import { pageActor, pageEm } from '@/src/web/page';
import { Calculator } from './calculator';

export const metadata: Metadata = { title: 'Calculator' };

export default async function CalculatorPage() {
  const actor = await pageActor();
  const em = await pageEm();
  const { items: stars } = await listStars(em, actor);
  const { items: materials } = await listMaterials(em, actor);
  return (
    <>
      <PageHeader
        title="Calculator"
        subtitle="One material, one star: beta over radius and the radii that go unbound. Nothing is stored; the address keeps what you typed."
      />
      <Calculator stars={stars} materials={materials} />
    </>
  );
}
