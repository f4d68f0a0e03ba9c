import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { may } from '@/src/access/policy';
import { PageHeader } from '@/src/ui/page-header';
import { pageActor } from '@/src/web/page';
import { NewStarForm } from './new-star-form';

export const metadata: Metadata = { title: 'New star' };

export default async function NewStarPage() {
  const actor = await pageActor();
  const mayOwn = [
    ...(may(actor, 'star.manageOwn') ? (['group'] as const) : []),
    ...(may(actor, 'star.manageShared') ? (['everybody'] as const) : []),
  ];
  if (mayOwn.length === 0) notFound();
  return (
    <>
      <PageHeader
        title="New star"
        subtitle="A draft first: nobody can use it before it is published, and then it cannot be changed any more."
      />
      <NewStarForm mayOwn={mayOwn} />
    </>
  );
}
