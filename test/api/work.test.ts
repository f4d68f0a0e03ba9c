import { beforeAll, describe, expect, test } from 'vitest';
import { POST as postCatalogue } from '@/app/api/v1/catalogues/route';
import { POST as postRun } from '@/app/api/v1/runs/route';
import { GET as getRun } from '@/app/api/v1/runs/[id]/route';
import { POST as cancel } from '@/app/api/v1/runs/[id]/cancel/route';
import { Catalogue, Grain, Run, RunGrain, Star, StarVersion } from '@/entities';
import { sendAbandonedWork } from '@/src/abandoned-work';
import { checkCatalogue } from '@/src/catalogues/check-catalogue';
import { claimRun } from '@/src/runs/claim-run';
import { forkEm } from '@/src/db';
import { executeRun } from '@/src/runs/execute-run';
import type { RunItem } from '@/src/runs/schema';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { circular } from './runs';
import { uploaded, uploadForm } from './upload';

withOwnDatabase();

let member: Member;
let catalogueId: string;
const request = (extra: object = {}) => ({
  catalogueId,
  starSlug: 'sun',
  release: circular,
  optics: { model: 'constant', qpr: 1 },
  ...extra,
});
const newRun = async () => (await json<{ id: string }>(call(postRun, { as: member, json: request() }), 202)).id;
const runNow = (id: string) => json<RunItem>(call(getRun, { as: member, params: { id } }));
const jobsFor = async (id: string) =>
  (await (await forkEm()).execute(`select id from pgboss.job where data->>'id' = ?`, [id])).length;

beforeAll(async () => {
  member = await newMember(await newGroup(), 'researcher');
  const rows = Array.from({ length: 9000 }, (_, index) => `${0.05 + index / 1000},2.5,astrosil`).join('\n');
  catalogueId = (await uploaded(member, { file: `radius_um,density_g_cm3,material\n${rows}\n` })).id;
});

describe('a run and its job', () => {
  test('come into being together', async () => {
    const id = await newRun();
    expect(await jobsFor(id)).toBe(1);
    expect(await runNow(id)).toMatchObject({ status: 'queued', summary: null, resultSha256: null });
  });

  test('done by two workers at once is done once', async () => {
    const id = await newRun();
    await Promise.all([executeRun(await forkEm(), id), executeRun(await forkEm(), id)]);
    expect(await runNow(id)).toMatchObject({ status: 'done', summary: { grains: 9000 } });
    expect(await (await forkEm()).count(RunGrain, { run: id })).toBe(9000);
    expect((await (await forkEm()).findOneOrFail(Run, { id })).attempts).toBe(1);
  });

  test('whose worker fell silent is taken over and gives the same result, once', async () => {
    const id = await newRun();
    await claimRun(await forkEm(), id);
    await executeRun(await forkEm(), id);
    expect((await runNow(id)).status).toBe('running');
    await (await forkEm()).nativeUpdate(Run, { id }, { heartbeatAt: new Date(Date.now() - 60_000) });
    await (await forkEm()).execute(`delete from pgboss.job where data->>'id' = ?`, [id]);
    expect(await sendAbandonedWork(await forkEm())).toBeGreaterThan(0);
    expect(await jobsFor(id)).toBe(1);
    await executeRun(await forkEm(), id);
    const done = await runNow(id);
    expect(done.status).toBe('done');
    const another = await newRun();
    await executeRun(await forkEm(), another);
    expect((await runNow(another)).resultSha256).toBe(done.resultSha256);
  });

  test('that was cancelled stays so and leaves no rows, also when a worker is at it', async () => {
    const queued = await newRun();
    await json(call(cancel, { as: member, params: { id: queued }, method: 'POST' }), 200);
    await executeRun(await forkEm(), queued);
    expect(await runNow(queued)).toMatchObject({ status: 'cancelled', summary: null });

    const running = await newRun();
    const work = executeRun(await forkEm(), running);
    await json(call(cancel, { as: member, params: { id: running }, method: 'POST' }), 200);
    await work;
    expect(await runNow(running)).toMatchObject({ status: 'cancelled', summary: null });
    expect(await (await forkEm()).count(RunGrain, { run: running })).toBe(0);
  });

  test('that ended cannot be cancelled', async () => {
    const id = await newRun();
    await executeRun(await forkEm(), id);
    const problem = await json(call(cancel, { as: member, params: { id }, method: 'POST' }), 409);
    expect(problem.detail).toMatch(/already ended/);
  });
});

describe('a catalogue whose check is claimed twice', () => {
  test('is imported once', async () => {
    const { id } = await json<{ id: string }>(call(postCatalogue, { as: member, form: uploadForm() }), 202);
    const limits = { maxRows: 1000 };
    await Promise.all([checkCatalogue(await forkEm(), id, limits), checkCatalogue(await forkEm(), id, limits)]);
    expect(await (await forkEm()).count(Grain, { catalogue: id })).toBe(1);
  });

  test('with more rows than allowed is refused and keeps none', async () => {
    const { id } = await json<{ id: string }>(
      call(postCatalogue, {
        as: member,
        form: uploadForm({ file: `radius_um,density_g_cm3,material\n${'1,2,astrosil\n'.repeat(20)}` }),
      }),
      202,
    );
    await checkCatalogue(await forkEm(), id, { maxRows: 10 });
    expect(await (await forkEm()).findOneOrFail(Catalogue, { id })).toMatchObject({
      status: 'failed',
      failure: expect.stringMatching(/10/),
    });
    expect(await (await forkEm()).count(Grain, { catalogue: id })).toBe(0);
  });
});

describe('what a run was made with', () => {
  test('stays when the preset changes afterwards', async () => {
    const id = await newRun();
    const em = await forkEm();
    const star = await em.findOneOrFail(Star, { slug: 'sun', group: null });
    em.create(StarVersion, {
      star,
      version: 2,
      status: 'published',
      name: 'Sun',
      massSun: 1,
      luminositySun: 1.1,
      teffK: 5772,
      citation: 'a test',
    });
    await em.flush();
    await executeRun(await forkEm(), id);
    expect((await runNow(id)).inputs).toMatchObject({ star: { version: 1, luminositySun: 1 } });
    expect((await runNow(await newRun())).inputs).toMatchObject({ star: { version: 2, luminositySun: 1.1 } });
  });

  test('cannot be changed in a published version, only retired', async () => {
    const em = await forkEm();
    const version = await em.findOneOrFail(StarVersion, { star: { slug: 'vega' } });
    await expect(em.nativeUpdate(StarVersion, { id: version.id }, { massSun: 3 })).rejects.toThrow(/immutable/);
    expect(await em.nativeUpdate(StarVersion, { id: version.id }, { status: 'retired' })).toBe(1);
    await expect(em.nativeUpdate(StarVersion, { id: version.id }, { status: 'draft' })).rejects.toThrow(/immutable/);
  });
});

describe('a request for a run', () => {
  test.each([
    ['an unknown star', { starSlug: 'nemesis' }, 422, '/starSlug'],
    ['two stars', { star: { massSun: 1, luminositySun: 1, teffK: 5772 } }, 400, '/starSlug'],
    ['an eccentricity of one', { release: { ...circular, eccentricity: 1 } }, 400, '/release/eccentricity'],
    ['an anomaly without an angle', { release: { ...circular, at: 'anomaly' } }, 400, '/release/trueAnomalyDeg'],
    ['constant optics without Q_pr', { optics: { model: 'constant' } }, 400, '/optics/qpr'],
    [
      'a mantle of nothing known',
      { optics: { model: 'mie', mantle: { material: 'slime', volumeFraction: 0.2 } } },
      422,
      '/optics/mantle/material',
    ],
    ['a field that does not exist', { colour: 'red' }, 400, '/'],
  ])('with %s is refused and points at it', async (_, extra, status, pointer) => {
    const problem = await json<{ errors: { pointer: string }[] }>(
      call(postRun, { as: member, json: request(extra) }),
      status,
    );
    expect(problem.errors.map((error) => error.pointer)).toContain(pointer);
  });

  test('on a catalogue that is not ready is refused', async () => {
    const failed = await uploaded(member, { file: 'nonsense' });
    const problem = await json(call(postRun, { as: member, json: request({ catalogueId: failed.id }) }), 409);
    expect(problem.detail).toMatch(/could not be read/);
  });

  test('that is not JSON, or far too long, is refused', async () => {
    await json(call(postRun, { as: member, method: 'POST', headers: { 'content-type': 'application/json' } }), 400);
    await json(call(postRun, { as: member, json: { ...request(), name: 'x'.repeat(2_000_000) } }), 413);
  });
});
