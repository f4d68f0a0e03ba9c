import type { Metadata } from 'next';
import { findRun } from '@/src/runs/find-runs';
import { PageHeader } from '@/src/ui/page-header';
import { inputsOf } from '@/src/ui/run-inputs-of';
import { RunLive } from '@/src/ui/run-live';
import { orNotFound, pageActor, pageEm } from '@/src/web/page';

type Props = { params: Promise<{ id: string }> };

async function runOf({ params }: Props) {
  const actor = await pageActor();
  return orNotFound(findRun(await pageEm(), actor, (await params).id));
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  return { title: (await runOf(props)).name };
}

export default async function RunPage(props: Props) {
  const run = await runOf(props);
  const { catalogue, star } = inputsOf(run);
  return (
    <>
      <PageHeader title={run.name} subtitle={`${catalogue.name}, ${star.name}`} />
      <RunLive initial={run} />
    </>
  );
}
