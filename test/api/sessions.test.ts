import { describe, expect, test } from 'vitest';
import { GET as listRuns, POST as postRun } from '@/app/api/v1/runs/route';
import { Membership, Person, PersonalToken, Session } from '@/entities';
import { forkEm } from '@/src/db';
import { Refusal } from '@/src/errors';
import { actorOfSession } from '@/src/people/actors';
import { endSession, sessionCookieName, startSession } from '@/src/people/sessions';
import { signIn } from '@/src/people/sign-in';
import { signUp } from '@/src/people/sign-up';
import { revokeToken } from '@/src/people/tokens';
import { refuseAbove, countAgainst, limits } from '@/src/web/rate-limit';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember } from './people';

withOwnDatabase();

const password = 'grains drift away';
const linkTo = (path: string) => `http://localhost${path}`;
let made = 0;
const newPerson = async () => {
  const email = `Someone${++made}@Example.org`.toLowerCase();
  const who = await signUp(await forkEm(), { name: 'Someone', email, password, groupName: 'A group' }, linkTo);
  return { email, ...who };
};
const cookie = (secret: string) => ({ cookie: `other=1; ${sessionCookieName}=${secret}` });

describe('signing up and in', () => {
  test('makes a person, a group of theirs, and a password that only its hash knows', async () => {
    const { email, personId, groupId } = await newPerson();
    const person = await (await forkEm()).findOneOrFail(Person, { email }, { populate: ['passwordHash'] });
    expect(person.passwordHash).toMatch(/^\$argon2id\$v=19\$m=47104,t=1,p=1\$/);
    expect(await (await forkEm()).findOneOrFail(Membership, { person: personId })).toMatchObject({
      role: 'pi',
      group: { id: groupId },
    });
    expect(await signIn(await forkEm(), { email, password })).toEqual({ personId, groupId });
  });

  test('tells a wrong password and an unknown address apart neither in words nor in kind', async () => {
    const { email } = await newPerson();
    const attempts = [
      { email, password: 'not this one at all' },
      { email: 'nobody@example.org', password },
    ];
    const refusals = await Promise.all(
      attempts.map(async (attempt) =>
        signIn(await forkEm(), attempt).catch((error: Refusal) => [error.kind, error.message]),
      ),
    );
    expect(refusals[0]).toEqual(refusals[1]);
    expect(refusals[0]).toEqual(['unauthenticated', expect.stringMatching(/do not belong together/)]);
  });

  test.each(['short', 'aaaaaaaaaaaaaaaa', 'x'.repeat(300)])('refuses the password %s', async (weak) => {
    const attempt = signUp(
      await forkEm(),
      { name: 'A', email: 'weak@example.org', password: weak, groupName: 'G' },
      linkTo,
    );
    await expect(attempt).rejects.toMatchObject({ kind: 'invalid', problems: [{ pointer: '/password' }] });
  });

  test('does not take an address twice', async () => {
    const { email } = await newPerson();
    await expect(signUp(await forkEm(), { name: 'B', email, password, groupName: 'G' }, linkTo)).rejects.toMatchObject({
      kind: 'conflict',
    });
  });
});

describe('a session', () => {
  test('is stored as a hash, opens the API, and ends', async () => {
    const { personId, groupId } = await newPerson();
    const secret = await startSession(await forkEm(), personId, groupId, 'a browser');
    expect(await (await forkEm()).count(Session, { id: secret })).toBe(0);
    expect((await call(listRuns, { headers: cookie(secret) })).status).toBe(200);
    await endSession(await forkEm(), secret);
    expect((await call(listRuns, { headers: cookie(secret) })).status).toBe(401);
  });

  test('ends when idle for too long, and at its last day whatever happens', async () => {
    const { personId, groupId } = await newPerson();
    for (const end of ['expiresAt', 'endsAt'] as const) {
      const secret = await startSession(await forkEm(), personId, groupId, '');
      await (await forkEm()).nativeUpdate(Session, { person: personId }, { [end]: new Date(Date.now() - 1000) });
      expect(await actorOfSession(await forkEm(), secret)).toBeNull();
    }
  });

  test('ASVS 7.3.2: lasts 30 days at most, an administrator’s half a day', async () => {
    const { personId, groupId } = await newPerson();
    const hoursOfNewest = async () => {
      await startSession(await forkEm(), personId, groupId, '');
      const [{ createdAt, endsAt }] = await (
        await forkEm()
      ).find(Session, { person: personId }, { orderBy: { createdAt: 'desc' }, limit: 1 });
      return Math.round((endsAt.getTime() - createdAt.getTime()) / 3_600_000);
    };
    expect(await hoursOfNewest()).toBe(720);
    await (await forkEm()).nativeUpdate(Person, { id: personId }, { platformRole: 'admin' });
    expect(await hoursOfNewest()).toBe(12);
  });

  test('of a person who left the group or was disabled opens nothing of it', async () => {
    const { personId, groupId } = await newPerson();
    const secret = await startSession(await forkEm(), personId, groupId, '');
    await (await forkEm()).nativeDelete(Membership, { person: personId });
    expect(await actorOfSession(await forkEm(), secret)).toMatchObject({ groupId: null, role: null });
    await (await forkEm()).nativeUpdate(Person, { id: personId }, { disabledAt: new Date() });
    expect(await actorOfSession(await forkEm(), secret)).toBeNull();
  });

  test('changes nothing for a page of another site', async () => {
    const { personId, groupId } = await newPerson();
    const secret = await startSession(await forkEm(), personId, groupId, '');
    const post = (headers: Record<string, string>) =>
      call(postRun, { json: {}, headers: { ...cookie(secret), ...headers } });
    expect((await post({ 'sec-fetch-site': 'cross-site' })).status).toBe(403);
    expect((await post({ origin: 'https://elsewhere.example', host: 'localhost' })).status).toBe(403);
    expect((await post({})).status).toBe(403);
    expect((await post({ 'sec-fetch-site': 'same-origin' })).status).toBe(400);
  });
});

describe('a personal token', () => {
  test('works until it is revoked or expires; the table keeps its hash', async () => {
    const member = await newMember(await newGroup(), 'researcher');
    expect((await call(listRuns, { as: member })).status).toBe(200);
    const row = await (await forkEm()).findOneOrFail(PersonalToken, { person: member.actor.personId });
    expect(JSON.stringify(row)).not.toContain(member.token);
    expect(row.lastUsedAt).not.toBeNull();
    await (await forkEm()).nativeUpdate(PersonalToken, { id: row.id }, { expiresAt: new Date(Date.now() - 1) });
    expect((await call(listRuns, { as: member })).status).toBe(401);
    const fresh = await newMember(member.actor.groupId!, 'student');
    const token = await (await forkEm()).findOneOrFail(PersonalToken, { person: fresh.actor.personId });
    await expect(revokeToken(await forkEm(), member.actor, token.id)).rejects.toMatchObject({ kind: 'notFound' });
    await revokeToken(await forkEm(), fresh.actor, token.id);
    expect((await call(listRuns, { as: fresh })).status).toBe(401);
  });

  test('that is unknown or malformed says so without a hint', async () => {
    for (const token of ['chaff_x', 'x'.repeat(500)]) {
      const problem = await json(call(listRuns, { as: { token } }), 401);
      expect(problem).toMatchObject({ type: '/problems/unauthenticated', status: 401 });
    }
  });
});

test('failures to sign in are counted and end in a refusal that says when to come back', async () => {
  const key = 'somebody@example.org';
  for (let failure = 0; failure < limits.signInFailure.points; failure += 1) {
    await refuseAbove('signInFailure', key);
    await countAgainst('signInFailure', key);
  }
  await expect(refuseAbove('signInFailure', key)).rejects.toMatchObject({
    kind: 'tooMany',
    retryAfterS: expect.any(Number),
  });
});
