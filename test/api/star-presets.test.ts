import { beforeAll, describe, expect, test } from 'vitest';
import { GET as listStars } from '@/app/api/v1/stars/route';
import { GET as getRun } from '@/app/api/v1/runs/[id]/route';
import { ChangeRecord, Person, StarVersion } from '@/entities';
import { forkEm } from '@/src/db';
import { actorOfEmail } from '@/src/people/actor-of-email';
import { starImpact } from '@/src/runs/star-impact';
import type { RunItem } from '@/src/runs/schema';
import type { StarItem } from '@/src/stars/schema';
import { draftNewStar, draftNextVersion, editDraft } from '@/src/stars/draft-star';
import { newerVersion } from '@/src/stars/newer-version';
import { publishStar, retireStar } from '@/src/stars/publish-star';
import { starCautions } from '@/src/stars/star-cautions';
import { starHistory } from '@/src/stars/star-history';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { circular, ran } from './runs';
import { uploaded } from './upload';

withOwnDatabase();

let pi: Member;
let researcher: Member;
let stranger: Member;
let admin: Member;

beforeAll(async () => {
  const group = await newGroup();
  pi = await newMember(group, 'pi');
  researcher = await newMember(group, 'researcher');
  stranger = await newMember(await newGroup(), 'pi');
  const made = await newMember(await newGroup(), 'student');
  await (await forkEm()).nativeUpdate(Person, { id: made.actor.personId }, { platformRole: 'admin' });
  admin = { ...made, actor: await actorOfEmail(await forkEm(), made.actor.email) };
});

const numbers = { massSun: 1.2, luminositySun: 1.9, teffK: 6100, name: 'Test star', citation: 'a test', note: '' };
const slugsOf = async (member: Member) =>
  (await json<{ items: StarItem[] }>(call(listStars, { as: member }))).items.map(({ slug }) => slug);
const refusal = (kind: string) => expect.objectContaining({ kind });

describe('a star of a group', () => {
  test('is seen by its group once it is published, and by nobody else', async () => {
    const { id } = await draftNewStar(await forkEm(), pi.actor, { ...numbers, slug: 'private_one', owner: 'group' });
    expect(await slugsOf(researcher)).not.toContain('private_one');
    await publishStar(await forkEm(), pi.actor, id);
    expect(await slugsOf(researcher)).toContain('private_one');
    expect(await slugsOf(stranger)).not.toContain('private_one');
    await expect(starHistory(await forkEm(), stranger.actor, 'private_one')).rejects.toEqual(refusal('notFound'));
    await expect(publishStar(await forkEm(), stranger.actor, id)).rejects.toEqual(refusal('notFound'));
    await retireStar(await forkEm(), pi.actor, id);
    expect(await slugsOf(researcher)).not.toContain('private_one');
  });

  test('is drafted by principal investigators alone', async () => {
    await expect(
      draftNewStar(await forkEm(), researcher.actor, { ...numbers, slug: 'no', owner: 'group' }),
    ).rejects.toEqual(refusal('forbidden'));
    await expect(
      draftNewStar(await forkEm(), pi.actor, { ...numbers, slug: 'no', owner: 'everybody' }),
    ).rejects.toEqual(refusal('forbidden'));
    await expect(draftNextVersion(await forkEm(), pi.actor, 'sun')).rejects.toEqual(refusal('forbidden'));
  });

  test('does not come twice under one name', async () => {
    await draftNewStar(await forkEm(), pi.actor, { ...numbers, slug: 'once', owner: 'group' });
    await expect(draftNewStar(await forkEm(), pi.actor, { ...numbers, slug: 'once', owner: 'group' })).rejects.toEqual(
      refusal('conflict'),
    );
  });
});

describe('a star for everybody', () => {
  test('gets a new version by an administrator, of which two publishing at once are one', async () => {
    const { id } = await draftNextVersion(await forkEm(), admin.actor, 'fomalhaut');
    await expect(draftNextVersion(await forkEm(), admin.actor, 'fomalhaut')).rejects.toEqual(refusal('conflict'));
    await editDraft(await forkEm(), admin.actor, id, { ...numbers, name: 'Fomalhaut', luminositySun: 17 });
    const outcomes = await Promise.allSettled([1, 2, 3].map(async () => publishStar(await forkEm(), admin.actor, id)));
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await (await forkEm()).count(ChangeRecord, { action: 'star.publish', targetId: id })).toBe(1);
    await expect(editDraft(await forkEm(), admin.actor, id, { ...numbers, luminositySun: 18 })).rejects.toEqual(
      refusal('conflict'),
    );
    const { versions } = await starHistory(await forkEm(), researcher.actor, 'fomalhaut');
    expect(versions.map(({ version, status, luminositySun }) => [version, status, luminositySun])).toEqual([
      [2, 'published', 17],
      [1, 'published', 16.63],
    ]);
  });

  test('drafted by two administrators at once has one draft', async () => {
    const outcomes = await Promise.allSettled(
      [1, 2].map(async () => draftNextVersion(await forkEm(), admin.actor, 'tau_cet')),
    );
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await (await forkEm()).count(StarVersion, { star: { slug: 'tau_cet' }, status: 'draft' })).toBe(1);
  });
});

describe('the impact of a version', () => {
  test('says how radii and shares of finished runs would move, and moves nothing', async () => {
    const catalogue = await uploaded(researcher, {
      file: `radius_um,density_g_cm3,material\n${[0.2, 0.4, 0.6, 0.8, 1].map((s) => `${s},2.5,astrosil`).join('\n')}\n`,
    });
    const run = await ran(researcher, {
      catalogueId: catalogue.id,
      starSlug: 'g2v',
      release: circular,
      optics: { model: 'constant', qpr: 1 },
    });
    const { id } = await draftNextVersion(await forkEm(), admin.actor, 'g2v');
    await editDraft(await forkEm(), admin.actor, id, {
      ...numbers,
      massSun: 1,
      luminositySun: 2 * 10 ** 0.01,
      teffK: 5770,
    });
    const [item] = await starImpact(await forkEm(), admin.actor, id);
    // beta is proportional to L/M: twice the luminosity of the table's G2V (10^0.01) doubles the radius of blow-out.
    expect(item).toMatchObject({ run: run.name, usedVersion: 1, shareBefore: 0.4, shareAfter: 0.8 });
    const [{ before, after }] = item.materials;
    expect((after[0][1] ?? NaN) / (before[0][1] ?? NaN)).toBeCloseTo(2, 8);
    const now = await json<RunItem>(call(getRun, { as: researcher, params: { id: run.id } }));
    expect(now).toEqual(run);
    expect(await newerVersion(await forkEm(), researcher.actor, { slug: 'g2v', version: 1 })).toBeNull();
    await publishStar(await forkEm(), admin.actor, id);
    expect(await newerVersion(await forkEm(), researcher.actor, { slug: 'g2v', version: 1 })).toBe(2);
  });

  test('is for those who may know of it', async () => {
    const { id } = await draftNextVersion(await forkEm(), admin.actor, 'k0v');
    await expect(starImpact(await forkEm(), pi.actor, id)).rejects.toEqual(refusal('notFound'));
    await expect(starImpact(await forkEm(), researcher.actor, id)).rejects.toEqual(refusal('forbidden'));
  });
});

test('numbers that do not fit together are pointed out', () => {
  expect(starCautions({ massSun: 1, luminositySun: 1, teffK: 5772, radiusSun: 1 })).toEqual([]);
  // Table 7 of the specification: the B8V radius disagrees with L and T by 9 % in its square: below the limit.
  expect(starCautions({ massSun: 3.38, luminositySun: 10 ** 2.188, teffK: 12300, radiusSun: 2.86 })).toEqual([]);
  expect(starCautions({ massSun: 1, luminositySun: 1, teffK: 5772, radiusSun: 1.5 })[0]).toMatch(
    /imply a radius of 1.00/,
  );
  expect(starCautions({ massSun: 1, luminositySun: 100, teffK: 4500 })[0]).toMatch(/2.0 dex brighter/);
});
