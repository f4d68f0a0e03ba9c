import { beforeEach, describe, expect, test } from 'vitest';
import { GET as listChanges } from '@/app/api/v1/changes/route';
import { GET as changesCsv } from '@/app/api/v1/changes.csv/route';
import { GET as listRuns } from '@/app/api/v1/runs/route';
import { ChangeRecord, Invitation, Membership, Person } from '@/entities';
import type { ChangeItem } from '@/src/audit/schema';
import { forkEm } from '@/src/db';
import { acceptAsNewPerson, acceptInvitation } from '@/src/people/accept-invitation';
import { actorOfSession } from '@/src/people/actors';
import { changeRole, leaveGroup, removeMember } from '@/src/people/change-members';
import { findGroup, groupsOf } from '@/src/people/find-group';
import { invite, revokeInvitation } from '@/src/people/invite';
import { openInvitation } from '@/src/people/open-invitation';
import { createGroup, groupToEnter, renameGroup } from '@/src/people/own-groups';
import { startSession } from '@/src/people/sessions';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { uploaded } from './upload';

withOwnDatabase();

const linkTo = (path: string) => `http://localhost${path}`;
const password = 'grains drift away';
let groupId: string;
let pi: Member;
let student: Member;

beforeEach(async () => {
  groupId = await newGroup();
  pi = await newMember(groupId, 'pi');
  student = await newMember(groupId, 'student');
});

const invited = async (email: string) => invite(await forkEm(), pi.actor, { email, role: 'researcher' }, linkTo);
const refusal = (kind: string) => expect.objectContaining({ kind });

describe('an invitation', () => {
  test('is made by a principal investigator alone', async () => {
    await expect(invite(await forkEm(), student.actor, { email: 'x@example.org', role: 'pi' }, linkTo)).rejects.toEqual(
      refusal('forbidden'),
    );
    const { secret } = await invited('new1@example.org');
    expect(JSON.stringify(await (await forkEm()).find(Invitation, {}))).not.toContain(secret);
  });

  test('is not used up by looking at it, and lets a new person in once', async () => {
    const { secret } = await invited('new2@example.org');
    for (let look = 0; look < 3; look += 1)
      expect(await openInvitation(await forkEm(), secret)).toMatchObject({ role: 'researcher', hasAccount: false });
    const joined = await acceptAsNewPerson(await forkEm(), { name: 'New', password }, secret);
    expect(joined.groupId).toBe(groupId);
    await expect(openInvitation(await forkEm(), secret)).rejects.toEqual(refusal('notFound'));
    await expect(acceptAsNewPerson(await forkEm(), { name: 'New', password }, secret)).rejects.toEqual(
      refusal('notFound'),
    );
  });

  test('accepted twice at once gives one membership', async () => {
    const other = await newMember(await newGroup(), 'student');
    const { secret } = await invited(other.actor.email);
    const outcomes = await Promise.allSettled(
      [1, 2, 3].map(async () => acceptInvitation(await forkEm(), other.actor, secret)),
    );
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await (await forkEm()).count(Membership, { group: groupId, person: other.actor.personId })).toBe(1);
  });

  test('accepted by two new people at once makes one account', async () => {
    const { secret } = await invited('both@example.org');
    const outcomes = await Promise.allSettled(
      ['A', 'B'].map(async (name) => acceptAsNewPerson(await forkEm(), { name, password }, secret)),
    );
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await (await forkEm()).count(Person, { email: 'both@example.org' })).toBe(1);
  });

  test('works for its own address alone', async () => {
    const stranger = await newMember(await newGroup(), 'pi');
    const { secret } = await invited('someone@example.org');
    await expect(acceptInvitation(await forkEm(), stranger.actor, secret)).rejects.toEqual(refusal('forbidden'));
  });

  test('revoked, expired, replaced and unknown ones all look the same', async () => {
    const revoked = await invited('a@example.org');
    await revokeInvitation(await forkEm(), pi.actor, revoked.id);
    const expired = await invited('b@example.org');
    await (await forkEm()).nativeUpdate(Invitation, { id: expired.id }, { expiresAt: new Date(Date.now() - 1) });
    const replaced = await invited('c@example.org');
    await invited('c@example.org');
    const messages = await Promise.all(
      [revoked.secret, expired.secret, replaced.secret, 'nothing'].map(async (secret) =>
        openInvitation(await forkEm(), secret).catch((error: Error) => error.message),
      ),
    );
    expect(new Set(messages).size).toBe(1);
  });

  test('of another group cannot be revoked', async () => {
    const { id } = await invited('d@example.org');
    const stranger = await newMember(await newGroup(), 'pi');
    await expect(revokeInvitation(await forkEm(), stranger.actor, id)).rejects.toEqual(refusal('notFound'));
  });
});

describe('a group', () => {
  test('keeps a principal investigator, even when two step down at once', async () => {
    await expect(leaveGroup(await forkEm(), pi.actor)).rejects.toEqual(refusal('conflict'));
    const second = await newMember(groupId, 'pi');
    const outcomes = await Promise.allSettled([
      leaveGroup(await forkEm(), pi.actor),
      leaveGroup(await forkEm(), second.actor),
    ]);
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await (await forkEm()).count(Membership, { group: groupId, role: 'pi' })).toBe(1);
  });

  test('is handed over by making somebody else investigator first', async () => {
    await changeRole(await forkEm(), pi.actor, student.actor.personId, 'pi');
    await leaveGroup(await forkEm(), pi.actor);
    expect(
      (await findGroup(await forkEm(), { ...student.actor, role: 'pi' })).members.map(({ personId }) => personId),
    ).toEqual([student.actor.personId]);
  });

  test('loses a removed person with their next request; what they made stays', async () => {
    const researcher = await newMember(groupId, 'researcher');
    const catalogue = await uploaded(researcher);
    const secret = await startSession(await forkEm(), researcher.actor.personId, groupId, '');
    await removeMember(await forkEm(), pi.actor, researcher.actor.personId);
    expect((await call(listRuns, { as: researcher })).status).toBe(401);
    expect(await actorOfSession(await forkEm(), secret)).toMatchObject({ groupId: null, role: null });
    expect(catalogue.status).toBe('ready');
    await expect(removeMember(await forkEm(), student.actor, pi.actor.personId)).rejects.toEqual(refusal('forbidden'));
  });

  test('of a student who was promoted, or demoted, counts from the next request', async () => {
    await changeRole(await forkEm(), pi.actor, student.actor.personId, 'researcher');
    expect((await uploaded(student)).status).toBe('ready');
    await changeRole(await forkEm(), pi.actor, student.actor.personId, 'student');
    await expect(uploaded(student)).rejects.toThrow(/403/);
  });

  test('can be started, entered and renamed by those who may', async () => {
    const { groupId: further } = await createGroup(await forkEm(), student.actor, { name: 'Further' });
    expect((await groupsOf(await forkEm(), student.actor)).map(({ id }) => id)).toEqual([groupId, further]);
    expect(await groupToEnter(await forkEm(), student.actor, further)).toEqual({ groupId: further });
    await expect(groupToEnter(await forkEm(), pi.actor, further)).rejects.toEqual(refusal('notFound'));
    await renameGroup(await forkEm(), pi.actor, { name: 'Renamed' });
    await expect(renameGroup(await forkEm(), student.actor, { name: 'Mine' })).rejects.toEqual(refusal('forbidden'));
    expect((await groupsOf(await forkEm(), pi.actor))[0].name).toBe('Renamed');
  });
});

describe('the record of changes', () => {
  const changesOf = (member: Member, query: Record<string, string> = {}) =>
    json<{ items: ChangeItem[]; next: string | null }>(call(listChanges, { as: member, query }));

  test('tells a principal investigator of the own group, an administrator of all, others nothing', async () => {
    await changeRole(await forkEm(), pi.actor, student.actor.personId, 'researcher');
    const stranger = await newMember(await newGroup(), 'pi');
    const { items } = await changesOf(pi, { action: 'changeRole' });
    expect(items).toEqual([
      expect.objectContaining({
        person: pi.actor.name,
        target: student.actor.name,
        before: { role: 'student' },
        after: { role: 'researcher' },
      }),
    ]);
    expect((await changesOf(stranger, { action: 'changeRole' })).items).toEqual([]);
    expect((await call(listChanges, { as: student })).status).toBe(403);
    const admin = await newMember(await newGroup(), 'student');
    await (await forkEm()).nativeUpdate(Person, { id: admin.actor.personId }, { platformRole: 'admin' });
    expect((await changesOf(admin, { action: 'changeRole', target: student.actor.name })).items).toHaveLength(1);
  });

  test('is searched by person, target and day, and downloaded', async () => {
    await uploaded(await newMember(groupId, 'researcher'), { name: '100 % of _it_' });
    expect((await changesOf(pi, { target: '0 % of _i' })).items).toHaveLength(1);
    expect((await changesOf(pi, { target: '0x% of _i' })).items).toHaveLength(0);
    expect((await changesOf(pi, { to: '2000-01-01' })).items).toHaveLength(0);
    expect((await call(listChanges, { as: pi, query: { from: 'yesterday' } })).status).toBe(400);
    const csv = await (await call(changesCsv, { as: pi, query: { action: 'catalogue.upload' } })).text();
    expect(csv.split('\r\n')[0]).toBe('time,person,action,kind,id,name,before,after');
    expect(csv).toContain('100 % of _it_');
  });

  test.each([
    ['changed', `update change_record set action = 'x'`],
    ['removed', 'delete from change_record'],
    ['emptied', 'truncate change_record'],
  ])('cannot be %s', async (_, sql) => {
    await expect((await forkEm()).execute(sql)).rejects.toThrow(/append-only/);
  });

  test('holds no secrets', async () => {
    const { secret } = await invited('secret@example.org');
    const all = JSON.stringify(await (await forkEm()).find(ChangeRecord, {}));
    for (const hidden of [secret, pi.token, 'argon2']) expect(all).not.toContain(hidden);
  });
});
