import type { Metadata } from 'next';
import { starCautions } from '@/src/stars/star-cautions';
import { starHistory } from '@/src/stars/star-history';
import type { StarItem } from '@/src/stars/schema';
import { ActionButton } from '@/src/ui/action-button';
import { LinkButton } from '@/src/ui/link-button';
import { Notice } from '@/src/ui/notice';
import { PageHeader } from '@/src/ui/page-header';
import { RunSection } from '@/src/ui/run-section';
import { orNotFound, pageActor, pageEm } from '@/src/web/page';
import { draftNextVersionAction, publishStarAction } from '../actions';
import { DraftForm } from './draft-form';
import { VersionTable } from './version-table';

type Props = { params: Promise<{ slug: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: `Star ${(await params).slug}` };
}

export default async function StarPage({ params }: Props) {
  const { slug } = await params;
  const actor = await pageActor();
  const { versions, manages } = await orNotFound(starHistory(await pageEm(), actor, slug));
  const draft = versions.find(({ status }) => status === 'draft');
  const [newest] = versions;
  return (
    <>
      <PageHeader
        title={newest?.name ?? slug}
        subtitle={newest?.ownedBy === 'group' ? 'A star of the group.' : 'A star for everybody.'}
      />
      <div className="grid gap-12">
        <RunSection id="versions" title="Versions">
          <VersionTable versions={versions} manages={manages} />
          {manages && !draft && (
            <div className="mt-6">
              <ActionButton action={draftNextVersionAction} fields={{ slug }}>
                Draft a new version
              </ActionButton>
            </div>
          )}
        </RunSection>
        {manages && draft && <Draft draft={draft} />}
      </div>
    </>
  );
}

function Draft({ draft }: { draft: StarItem }) {
  const cautions = starCautions({ ...draft, radiusSun: draft.radiusSun ?? undefined });
  return (
    <RunSection id="draft" title={`Draft of version ${draft.version}`}>
      <div className="grid gap-6">
        {cautions.map((caution) => (
          <Notice key={caution} kind="caution">
            {caution}
          </Notice>
        ))}
        <DraftForm id={draft.id} values={valuesOf(draft)} />
        <div className="flex flex-wrap items-start gap-3">
          <LinkButton href={`/stars/${draft.slug}/impact?version=${draft.id}`}>What it would change</LinkButton>
          <ActionButton
            action={publishStarAction}
            fields={{ id: draft.id }}
            variant="primary"
            question="Publish this version? It cannot be changed any more."
          >
            Publish
          </ActionButton>
        </div>
      </div>
    </RunSection>
  );
}

const valuesOf = (draft: StarItem) => ({
  name: draft.name,
  spectralType: draft.spectralType ?? '',
  massSun: String(draft.massSun),
  luminositySun: String(draft.luminositySun),
  teffK: String(draft.teffK),
  radiusSun: draft.radiusSun === null ? '' : String(draft.radiusSun),
  citation: draft.citation,
  note: draft.note,
});
