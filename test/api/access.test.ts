import { beforeAll, describe, expect, test } from 'vitest';
import { forkEm } from '@/src/db';
import { draftNewStar } from '@/src/stars/draft-star';
import { contract } from '@/src/web/contract';
import type { Endpoint } from '@/src/web/endpoint';
import { call, json } from './call';
import { handlerOf } from './handlers';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { circular, ran } from './runs';
import { uploaded, uploadForm } from './upload';

withOwnDatabase();

type Name = keyof typeof contract;

let own: Member;
let student: Member;
let investigator: Member;
let other: Member;
let readOnly: Member;
let ids: { catalogue: string; run: string; share: string; star: string };

beforeAll(async () => {
  const group = await newGroup();
  own = await newMember(group, 'researcher');
  student = await newMember(group, 'student');
  investigator = await newMember(group, 'pi');
  readOnly = await newMember(group, 'researcher', ['read']);
  other = await newMember(await newGroup(), 'pi');
  const catalogue = await uploaded(own);
  const run = await ran(own, {
    catalogueId: catalogue.id,
    starSlug: 'sun',
    release: circular,
    optics: { model: 'constant', qpr: 1 },
  });
  const share = async () =>
    (
      await json<{ id: string }>(
        call(await handlerOf(contract.makeShare), { as: own, params: { id: run.id }, json: {} }),
        201,
      )
    ).id;
  ids = { catalogue: catalogue.id, run: run.id, share: await share(), star: await groupStar() };
  newShareId = share;
});

/** A star of the group alone: another group must not learn of it. */
async function groupStar(): Promise<string> {
  const draft = {
    name: 'Own',
    slug: 'own_star',
    owner: 'group' as const,
    massSun: 1,
    luminositySun: 1,
    teffK: 5772,
    citation: 'a test',
    note: '',
  };
  return (await draftNewStar(await forkEm(), investigator.actor, draft)).id;
}

/** Revoking uses a link up: whoever may is given a fresh one. */
let newShareId: () => Promise<string>;

function paramsOf(path: string): { id: string } {
  if (path.startsWith('/shares')) return { id: ids.share };
  if (path.startsWith('/stars')) return { id: ids.star };
  return { id: path.startsWith('/runs') ? ids.run : ids.catalogue };
}

async function ask(name: Name, as?: Member, id?: string): Promise<Response> {
  if (name === 'revokeShare' && as === own) ids.share = await newShareId();
  const { method, path }: Endpoint = contract[name];
  const bodies: Partial<Record<Name, object>> = {
    requestRun: {
      json: { catalogueId: ids.catalogue, starSlug: 'sun', release: circular, optics: { model: 'constant', qpr: 1 } },
    },
    computeCurve: { json: { slug: 'astrosil', starSlug: 'sun', optics: { model: 'constant', qpr: 1 } } },
    uploadCatalogue: { form: uploadForm() },
    makeShare: { json: {} },
  };
  return call(await handlerOf(contract[name]), {
    as,
    params: id === undefined ? paramsOf(path) : { id },
    method: method.toUpperCase(),
    ...bodies[name],
  });
}

const names = Object.keys(contract) as Name[];
const ofAGroup = names.filter((name) => contract[name].path.includes('{id}'));

/** What a student may not do; everything else in the contract is for every member of the group. */
const notForStudents = new Set<Name>(['uploadCatalogue', 'makeShare', 'revokeShare']);
/** For principal investigators (and administrators) alone. */
const forInvestigators = new Set<Name>(['listChanges', 'downloadChanges', 'downloadImpact']);
const changes = new Set<Name>(['uploadCatalogue', 'requestRun', 'cancelRun', 'makeShare', 'revokeShare']);
/** A run that has ended cannot be cancelled: that, not the access, is what is refused. */
const conflicts = new Set<Name>(['cancelRun']);

describe('every route of the contract', () => {
  test.each(names)('%s is closed to people who are not signed in', async (name) => {
    expect((await ask(name)).status).toBe(401);
  });

  test.each(ofAGroup)('%s does not tell another group from nothing', async (name) => {
    const foreign = await json(ask(name, other), 404);
    const nothing = await json(ask(name, investigator, '00000000-0000-4000-8000-000000000000'), 404);
    expect({ ...foreign, instance: '' }).toEqual({ ...nothing, instance: '' });
  });

  test.each(names)('%s is open to those it is for', async (name) => {
    const { status } = await ask(name, forInvestigators.has(name) ? investigator : own);
    expect(status).toBe(conflicts.has(name) ? 409 : ((contract[name] as Endpoint).status ?? 200));
    if (forInvestigators.has(name)) expect((await ask(name, own)).status).toBe(403);
  });

  test.each(names)('%s and students: as the table says', async (name) => {
    const { status } = await ask(name, student);
    expect(status === 403).toBe(notForStudents.has(name) || forInvestigators.has(name));
  });

  test.each(names)('%s and a token that may only read', async (name) => {
    expect((await ask(name, readOnly)).status === 403).toBe(changes.has(name) || forInvestigators.has(name));
  });

  test.each(['not-a-uuid', '1', "' or 1=1"])('an id such as %s is nothing', async (id) => {
    await json(call(await handlerOf(contract.getRun), { as: own, params: { id } }), 404);
  });
});

test('lists show the own group alone', async () => {
  const { items } = await json<{ items: unknown[] }>(ask('listRuns', other));
  expect(items).toEqual([]);
});

test('a run on another group’s catalogue is refused as if there were none', async () => {
  const body = {
    catalogueId: ids.catalogue,
    starSlug: 'sun',
    release: circular,
    optics: { model: 'constant', qpr: 1 },
  };
  await json(call(await handlerOf(contract.requestRun), { as: other, json: body }), 404);
});
