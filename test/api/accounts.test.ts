import { beforeEach, describe, expect, test } from 'vitest';
import { AccountLink, Mail, Person, Session } from '@/entities';
import { forkEm } from '@/src/db';
import { isOpenLink } from '@/src/people/account-links';
import { actorOfEmail } from '@/src/people/actor-of-email';
import { actorOfSession } from '@/src/people/actors';
import { changePassword } from '@/src/people/change-password';
import { endOwnSession, listSessions } from '@/src/people/own-sessions';
import { askForReset, resetPassword } from '@/src/people/reset-password';
import { startSession } from '@/src/people/sessions';
import { signIn } from '@/src/people/sign-in';
import { signUp } from '@/src/people/sign-up';
import { isVerified, verifyAddress } from '@/src/people/verify-address';
import { withOwnDatabase } from './own-database';

withOwnDatabase();

const password = 'grains drift away';
const linkTo = (path: string) => `http://localhost${path}`;
let made = 0;
let email: string;

beforeEach(async () => {
  email = `account${++made}@example.org`;
  await signUp(await forkEm(), { name: 'Someone', email, password, groupName: 'G' }, linkTo);
});

const actor = async () => actorOfEmail(await forkEm(), email);
const mailsTo = async (kind: string) =>
  (await forkEm()).find(Mail, { toAddress: email, kind }, { orderBy: { createdAt: 'asc' } });
const secretIn = ({ text }: Mail) => /\/(?:verify|reset)\/(\S+)/.exec(text)?.[1] ?? '';
const newReset = async () => {
  await askForReset(await forkEm(), { email }, linkTo);
  return secretIn((await mailsTo('reset')).at(-1)!);
};

describe('confirming an address', () => {
  test('is asked for at sign-up, uses nothing up by looking, works once', async () => {
    const [mail] = await mailsTo('verify');
    const secret = secretIn(mail);
    expect(JSON.stringify(await (await forkEm()).find(AccountLink, {}))).not.toContain(secret);
    expect(await isVerified(await forkEm(), await actor())).toBe(false);
    expect(await isOpenLink(await forkEm(), secret, 'verify')).toBe(true);
    expect(await isOpenLink(await forkEm(), secret, 'reset')).toBe(false);
    await verifyAddress(await forkEm(), secret);
    expect(await isVerified(await forkEm(), await actor())).toBe(true);
    await expect(verifyAddress(await forkEm(), secret)).rejects.toMatchObject({ kind: 'notFound' });
  });
});

describe('a forgotten password', () => {
  test('ASVS 6.4.1: the link expires, works once, for the newest asked for', async () => {
    const first = await newReset();
    const second = await newReset();
    await expect(resetPassword(await forkEm(), first, { password: 'another long one' })).rejects.toMatchObject({
      kind: 'notFound',
    });
    await (
      await forkEm()
    ).nativeUpdate(AccountLink, { usedAt: null, purpose: 'reset' }, { expiresAt: new Date(Date.now() - 1) });
    await expect(resetPassword(await forkEm(), second, { password: 'another long one' })).rejects.toMatchObject({
      kind: 'notFound',
    });
    const third = await newReset();
    const outcomes = await Promise.allSettled(
      [1, 2].map(async (n) => resetPassword(await forkEm(), third, { password: `another long one ${n}` })),
    );
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  test('ends every session, signs nobody in, and tells the address', async () => {
    const { personId, groupId } = await signIn(await forkEm(), { email, password });
    const cookie = await startSession(await forkEm(), personId, groupId, '');
    await resetPassword(await forkEm(), await newReset(), { password: 'another long one' });
    expect(await actorOfSession(await forkEm(), cookie)).toBeNull();
    expect(await (await forkEm()).count(Session, { person: personId })).toBe(0);
    await expect(signIn(await forkEm(), { email, password })).rejects.toMatchObject({ kind: 'unauthenticated' });
    expect(await signIn(await forkEm(), { email, password: 'another long one' })).toMatchObject({ personId });
    expect(await mailsTo('passwordChanged')).toHaveLength(1);
  });

  test('of an unknown or disabled person writes to nobody and says nothing', async () => {
    const before = await (await forkEm()).count(Mail, {});
    await askForReset(await forkEm(), { email: 'nobody@example.org' }, linkTo);
    await (await forkEm()).nativeUpdate(Person, { email }, { disabledAt: new Date() });
    await askForReset(await forkEm(), { email }, linkTo);
    expect(await (await forkEm()).count(Mail, {})).toBe(before);
  });

  test('keeps the old password when the new one is weak', async () => {
    const secret = await newReset();
    await expect(resetPassword(await forkEm(), secret, { password: 'short' })).rejects.toMatchObject({
      kind: 'invalid',
    });
    expect(await isOpenLink(await forkEm(), secret, 'reset')).toBe(true);
  });
});

describe('changing the password', () => {
  test('ASVS 6.2.3: needs the old one, and ends the sessions there are', async () => {
    const { personId, groupId } = await signIn(await forkEm(), { email, password });
    const cookie = await startSession(await forkEm(), personId, groupId, '');
    await expect(
      changePassword(await forkEm(), await actor(), { oldPassword: 'not it at all', password: 'a new long one' }),
    ).rejects.toMatchObject({ problems: [{ pointer: '/oldPassword' }] });
    expect(await actorOfSession(await forkEm(), cookie)).not.toBeNull();
    await changePassword(await forkEm(), await actor(), { oldPassword: password, password: 'a new long one' });
    expect(await actorOfSession(await forkEm(), cookie)).toBeNull();
    expect(await mailsTo('passwordChanged')).toHaveLength(1);
  });
});

describe('ASVS 7.5.2: sessions', () => {
  test('are listed and ended by their own person alone', async () => {
    const { personId, groupId } = await signIn(await forkEm(), { email, password });
    const here = await startSession(await forkEm(), personId, groupId, 'this browser');
    const there = await startSession(await forkEm(), personId, groupId, 'that browser');
    const sessions = await listSessions(await forkEm(), await actor(), here);
    expect(sessions.map(({ userAgent, isThisOne }) => [userAgent, isThisOne]).sort()).toEqual([
      ['that browser', false],
      ['this browser', true],
    ]);
    const { id } = sessions.find(({ isThisOne }) => !isThisOne)!;
    await signUp(
      await forkEm(),
      { name: 'Other', email: `other${made}@example.org`, password, groupName: 'G' },
      linkTo,
    );
    const other = await actorOfEmail(await forkEm(), `other${made}@example.org`);
    await expect(endOwnSession(await forkEm(), other, id)).rejects.toMatchObject({ kind: 'notFound' });
    await endOwnSession(await forkEm(), await actor(), id);
    expect(await actorOfSession(await forkEm(), there)).toBeNull();
    expect(await actorOfSession(await forkEm(), here)).not.toBeNull();
  });
});
