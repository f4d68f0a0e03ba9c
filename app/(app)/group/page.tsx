import type { Metadata } from 'next';
import Link from 'next/link';
import { may } from '@/src/access/policy';
import { findGroup, groupsOf } from '@/src/people/find-group';
import { ActionButton } from '@/src/ui/action-button';
import { PageHeader } from '@/src/ui/page-header';
import { RunSection } from '@/src/ui/run-section';
import { pageActor, pageEm } from '@/src/web/page';
import { createGroupAction, leaveGroupAction, renameGroupAction } from './actions';
import { GroupChoice } from './group-choice';
import { GroupNameForm } from './group-name-form';
import { InvitationTable } from './invitation-table';
import { InviteForm } from './invite-form';
import { MemberTable } from './member-table';

export const metadata: Metadata = { title: 'Group' };

export default async function GroupPage() {
  const actor = await pageActor();
  const em = await pageEm();
  const groups = await groupsOf(em, actor);
  const group = may(actor, 'group.read') ? await findGroup(em, actor) : null;
  const manages = may(actor, 'group.manage');
  return (
    <>
      <PageHeader
        title={group?.name ?? 'You are in no group'}
        subtitle={
          <Link href="/roles" className="prose-link">
            What each role may do
          </Link>
        }
      />
      <div className="grid gap-12">
        {group && (
          <RunSection id="members" title="People">
            <MemberTable members={group.members} self={actor.personId} manages={manages} />
          </RunSection>
        )}
        {group && manages && (
          <RunSection id="invite" title="Invite somebody">
            <InviteForm />
            <InvitationTable invitations={group.invitations} />
          </RunSection>
        )}
        {group && manages && (
          <RunSection id="rename" title="Name of the group">
            <GroupNameForm action={renameGroupAction} label="Name of this group" name={group.name} button="Rename" />
          </RunSection>
        )}
        <RunSection id="groups" title="Your groups">
          <GroupChoice groups={groups} current={actor.groupId} />
          <div className="mt-6">
            <GroupNameForm action={createGroupAction} label="Start a further group" button="Start the group" />
          </div>
          {group && (
            <div className="mt-6">
              <ActionButton
                action={leaveGroupAction}
                variant="danger"
                question={`Leave ${group.name}? What you made stays with it.`}
              >
                Leave {group.name}
              </ActionButton>
            </div>
          )}
        </RunSection>
      </div>
    </>
  );
}
