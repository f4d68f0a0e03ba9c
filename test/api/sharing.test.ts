import { beforeAll, describe, expect, test } from 'vitest';
import { GET as sharedCurves } from '@/app/api/s/[secret]/curves/route';
import { GET as sharedCsv } from '@/app/api/s/[secret]/export.csv/route';
import { GET as sharedGrains } from '@/app/api/s/[secret]/grains/route';
import { GET as sharedHistogram } from '@/app/api/s/[secret]/histogram/route';
import { GET as listShares, POST as makeShare } from '@/app/api/v1/runs/[id]/shares/route';
import { DELETE as revokeShare } from '@/app/api/v1/shares/[id]/route';
import { Share } from '@/entities';
import { forkEm } from '@/src/db';
import { openShare, sharedItem, unlock } from '@/src/sharing/open-share';
import type { RunGrainItem } from '@/src/runs/schema';
import type { ShareItem } from '@/src/sharing/schema';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { circular, ran } from './runs';
import { uploaded } from './upload';

withOwnDatabase();

type Made = { id: string; url: string; expiresAt: string };

let member: Member;
let student: Member;
let other: Member;
let runId: string;

beforeAll(async () => {
  process.env.CHAFFLINE_SECRET = 'a secret for tests alone, of thirty-two characters and more';
  const group = await newGroup('A group with a telling name');
  member = await newMember(group, 'researcher');
  student = await newMember(group, 'student');
  other = await newMember(await newGroup(), 'pi');
  const catalogue = await uploaded(member);
  runId = (
    await ran(member, {
      catalogueId: catalogue.id,
      starSlug: 'sun',
      release: circular,
      optics: { model: 'constant', qpr: 1 },
    })
  ).id;
});

const newLink = async (request: object = {}) => {
  const made = await json<Made>(call(makeShare, { as: member, params: { id: runId }, json: request }), 201);
  return { ...made, secret: made.url.split('/s/')[1] };
};
const grainsBy = (secret: string, headers: Record<string, string> = {}) =>
  call(sharedGrains, { params: { secret }, headers });
const gone = async (secret: string) => ({ ...(await json(grainsBy(secret), 404)), instance: '' });

describe('a link', () => {
  test('opens the data of its run to somebody without an account', async () => {
    const { secret } = await newLink();
    expect((await json<{ items: RunGrainItem[] }>(grainsBy(secret))).items).toHaveLength(1);
    expect((await call(sharedHistogram, { params: { secret } })).status).toBe(200);
    expect((await call(sharedCurves, { params: { secret } })).status).toBe(200);
  });

  test('shows neither people nor ids nor siblings', async () => {
    const { secret } = await newLink();
    const shown = JSON.stringify(sharedItem(await openShare(await forkEm(), secret)));
    for (const hidden of [member.actor.name, member.actor.personId, member.actor.groupId!, 'telling name', runId])
      expect(shown).not.toContain(hidden);
  });

  test('allows downloads only when it was made so', async () => {
    expect((await call(sharedCsv, { params: { secret: (await newLink()).secret } })).status).toBe(403);
    expect((await call(sharedCsv, { params: { secret: (await newLink({ mayDownload: true })).secret } })).status).toBe(
      200,
    );
  });

  test('is a 256-bit secret of which the table has the hash', async () => {
    const { secret, expiresAt } = await newLink();
    expect(Buffer.from(secret, 'base64url')).toHaveLength(32);
    expect(JSON.stringify(await (await forkEm()).find(Share, {}))).not.toContain(secret);
    expect(Math.round((Date.parse(expiresAt) - Date.now()) / 86_400_000)).toBe(30);
  });

  test('revoked, expired and never made look the same', async () => {
    const revoked = await newLink();
    await call(revokeShare, { as: member, params: { id: revoked.id }, method: 'DELETE' });
    const expired = await newLink();
    await (await forkEm()).nativeUpdate(Share, { id: expired.id }, { expiresAt: new Date(Date.now() - 1) });
    const answers = [await gone(revoked.secret), await gone(expired.secret), await gone('never')];
    expect(answers[1]).toEqual(answers[0]);
    expect(answers[2]).toEqual(answers[0]);
  });

  test('that is revoked during reads opens nothing afterwards', async () => {
    const { id, secret } = await newLink();
    let revokedAt = Infinity;
    const reads = Array.from({ length: 50 }, async (_, index) => {
      await new Promise((later) => setTimeout(later, index * 4));
      const startedAt = performance.now();
      const { status } = await grainsBy(secret);
      return { startedAt, status };
    });
    await new Promise((later) => setTimeout(later, 80));
    expect((await call(revokeShare, { as: member, params: { id }, method: 'DELETE' })).status).toBe(204);
    revokedAt = performance.now();
    const outcomes = await Promise.all(reads);
    expect(outcomes.filter(({ startedAt, status }) => startedAt > revokedAt && status !== 404)).toEqual([]);
    expect(outcomes.some(({ status }) => status === 200)).toBe(true);
  });
});

describe('a passphrase', () => {
  test('is needed, is not stored, and its proof is good for one link alone', async () => {
    const first = await newLink({ passphrase: 'winnow the chaff' });
    const second = await newLink({ passphrase: 'winnow the chaff' });
    expect((await grainsBy(first.secret)).status).toBe(401);
    const share = await openShare(await forkEm(), first.secret);
    expect(share.passphraseHash).toMatch(/^\$argon2id\$/);
    expect(await unlock(share, 'not this one')).toBeNull();
    const { name, proof } = (await unlock(share, 'winnow the chaff'))!;
    expect((await grainsBy(first.secret, { cookie: `${name}=${proof}` })).status).toBe(200);
    const forged = `__Host-share-${second.id.slice(0, 8)}=${proof}`;
    expect((await grainsBy(second.secret, { cookie: forged })).status).toBe(401);
    const later = `${Number(proof.split('.')[0]) + 1}.${proof.split('.')[1]}`;
    expect((await grainsBy(first.secret, { cookie: `${name}=${later}` })).status).toBe(401);
  });
});

describe('links of a run', () => {
  test('are seen by its group, made and revoked by those who may', async () => {
    const { id } = await newLink();
    const { items } = await json<{ items: ShareItem[] }>(call(listShares, { as: student, params: { id: runId } }));
    expect(items[0]).toMatchObject({ id, createdBy: member.actor.name, state: 'open', views: 0 });
    expect((await call(makeShare, { as: student, params: { id: runId }, json: {} })).status).toBe(403);
    expect((await call(revokeShare, { as: student, params: { id }, method: 'DELETE' })).status).toBe(403);
    expect((await call(listShares, { as: other, params: { id: runId } })).status).toBe(404);
    expect((await call(revokeShare, { as: other, params: { id }, method: 'DELETE' })).status).toBe(404);
  });

  test.each([{ expiresInDays: 0 }, { expiresInDays: 366 }, { passphrase: 'short' }, { colour: 'red' }])(
    'are refused when asked for with %j',
    async (request) => {
      expect((await call(makeShare, { as: member, params: { id: runId }, json: request })).status).toBe(400);
    },
  );
});
