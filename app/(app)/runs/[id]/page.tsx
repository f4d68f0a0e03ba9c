import type { Metadata } from 'next';
import { may } from '@/src/access/policy';
import { findRun } from '@/src/runs/find-runs';
import { newerVersion } from '@/src/stars/newer-version';
import { LinkButton } from '@/src/ui/link-button';
import { Notice } from '@/src/ui/notice';
import { PageHeader } from '@/src/ui/page-header';
import { inputsOf } from '@/src/ui/run-inputs-of';
import { RunLive } from '@/src/ui/run-live';
import { SharePanel } from '@/src/ui/share-panel';
import { orNotFound, pageActor, pageEm } from '@/src/web/page';
import { idOrNowhere } from '../../nowhere';

type Props = { params: Promise<{ id: string }> };

async function runOf({ params }: Props) {
  const actor = await pageActor();
  return orNotFound(findRun(await pageEm(), actor, idOrNowhere((await params).id)));
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  return { title: (await runOf(props)).name };
}

export default async function RunPage(props: Props) {
  const run = await runOf(props);
  const { catalogue, star } = inputsOf(run);
  const newer = await newerVersion(await pageEm(), await pageActor(), star);
  return (
    <>
      <PageHeader title={run.name} subtitle={`${catalogue.name}, ${star.name}`} />
      {newer !== null && (
        <div className="mb-8">
          <Notice kind="info" title={`A newer version of ${star.name} exists`}>
            <p className="mb-2">{`This run keeps version ${star.version}; version ${newer} is what a new run would use.`}</p>
            <LinkButton href={`/runs/new?from=${run.id}`} size="small">
              Run again with version {newer}
            </LinkButton>
          </Notice>
        </div>
      )}
      <RunLive initial={run}>
        <SharePanel runId={run.id} manages={may(await pageActor(), 'share.manage')} />
      </RunLive>
    </>
  );
}
