import { beforeAll, describe, expect, test } from 'vitest';
import { GET as getGrains } from '@/app/api/v1/runs/[id]/grains/route';
import { GET as getHistogram } from '@/app/api/v1/runs/[id]/histogram/route';
import { GET as getCurves } from '@/app/api/v1/runs/[id]/curves/route';
import { GET as exportCsv } from '@/app/api/v1/runs/[id]/export.csv/route';
import { POST as postCurve } from '@/app/api/v1/curves/route';
import type { CurveAnswer, RunCurves, RunGrainItem, RunHistogram, RunItem } from '@/src/runs/schema';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { circular, ran } from './runs';
import { uploaded } from './upload';

withOwnDatabase();

/** SPEC of the table: hand-checked fates of seven grains at the Sun, Q_pr 1, circular release (1 repelled, 3 more unbound, 3 bound). */
const sevenGrains = [
  'radius_um,density_g_cm3,material,label',
  '0.1,2.5,astrosil,a',
  '0.4,2.5,astrosil,b',
  '0.459,2.5,astrosil,c',
  '0.46,2.5,astrosil,d',
  '1,1.0,carbon_be,e',
  '1.2,1.0,carbon_be,f',
  '10,3.3,astrosil,',
].join('\n');

/** 3 L/(16 pi GM c) for the nominal Sun, kg/m2: IAU 2015 B3 and SI constants, evaluated independently with 40 digits. */
const betaTimesRhoTimesS = 0.0005742367612423301;

let member: Member;
let run: RunItem;

beforeAll(async () => {
  member = await newMember(await newGroup(), 'researcher');
  const catalogue = await uploaded(member, { file: sevenGrains });
  run = await ran(member, {
    catalogueId: catalogue.id,
    starSlug: 'sun',
    release: circular,
    optics: { model: 'constant', qpr: 1 },
  });
});

const grainsOf = (query: Record<string, string>) =>
  json<{ items: RunGrainItem[]; next: string | null; total: number }>(
    call(getGrains, { as: member, params: { id: run.id }, query }),
  );

describe('a run with constant Q_pr', () => {
  test('finds the fates that a table worked by hand has', () => {
    expect(run).toMatchObject({ status: 'done', progress: 1, error: null });
    expect(run.summary).toMatchObject({ grains: 7, betaCritical: 0.5, unbound: { rows: 4, number: 4, repelled: 1 } });
    expect(run.summary?.unbound.numberShare).toBeCloseTo(4 / 7, 12);
    expect(run.summary?.unbound.areaShare).toBeCloseTo(0.013400470091504623, 10);
  });

  test('gives beta of each grain as the closed form does', async () => {
    const { items } = await grainsOf({});
    expect(items).toHaveLength(7);
    for (const { beta, radiusUm, densityGCm3 } of items) {
      expect(beta / (betaTimesRhoTimesS / (radiusUm * 1e-6 * densityGCm3 * 1000))).toBeCloseTo(1, 9);
    }
  });

  test('says null where a quantity does not exist', async () => {
    const { items } = await grainsOf({ sort: 'beta', order: 'desc', limit: '1' });
    expect(items[0]).toMatchObject({
      label: 'a',
      fate: 'unbound',
      regime: 'unbound',
      prTimeYr: null,
      semiMajorAxisAu: null,
      lorentzRatio: null,
      pUnbound: 1,
    });
    expect(items[0].vInfKmS).toBeGreaterThan(0);
  });

  test.each(['ordinal', 'label', 'material', 'beta', 'prTimeYr', 'vInfKmS', 'fate', 'count'])(
    'is paged by %s without losing or repeating a row',
    async (sort) => {
      for (const order of ['asc', 'desc']) {
        const seen: number[] = [];
        let after: string | null = null;
        do {
          const page: Awaited<ReturnType<typeof grainsOf>> = await grainsOf({
            sort,
            order,
            limit: '2',
            ...(after ? { after } : {}),
          });
          expect(page.total).toBe(7);
          seen.push(...page.items.map(({ ordinal }) => ordinal));
          after = page.next;
        } while (after);
        expect([...seen].sort()).toEqual([0, 1, 2, 3, 4, 5, 6]);
      }
    },
  );

  test('is filtered over all rows', async () => {
    expect((await grainsOf({ fate: 'unbound' })).total).toBe(4);
    expect((await grainsOf({ material: 'carbon_be' })).items.map(({ label }) => label)).toEqual(['e', 'f']);
    expect((await grainsOf({ radiusUmMin: '0.4', radiusUmMax: '0.46' })).total).toBe(3);
    expect((await grainsOf({ betaMin: '1' })).total).toBe(1);
    expect((await grainsOf({ label: '%' })).total).toBe(0);
  });

  test('has a histogram whose bins add up to the population', async () => {
    const histogram = await json<RunHistogram>(
      call(getHistogram, { as: member, params: { id: run.id }, query: { by: 'number' } }),
    );
    const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);
    expect(histogram.edgesUm).toHaveLength(histogram.unbound.length + 1);
    expect([sum(histogram.unbound), sum(histogram.bound)]).toEqual([4, 3]);
    expect(histogram.edgesUm[0]).toBeCloseTo(0.1, 9);
    expect(histogram.edgesUm.at(-1)).toBeCloseTo(10, 9);
  });

  test('is exported as CSV with units in the header and empty cells for what does not exist', async () => {
    const response = await call(exportCsv, { as: member, params: { id: run.id } });
    expect(response.headers.get('content-type')).toContain('text/csv');
    const lines = (await response.text()).trimEnd().split('\r\n');
    expect(lines).toHaveLength(8);
    expect(lines[0]).toMatch(/^ordinal,label,material,radius_um,density_g_cm3,count,q_pr,beta,/);
    expect(lines[1]).toMatch(/^0,a,astrosil,0\.1,2\.5,1,1,2\.29/);
  });

  test('gives the same bits when it is computed again', async () => {
    const again = await ran(member, {
      catalogueId: (run.inputs as { catalogue: { id: string } }).catalogue.id,
      starSlug: 'sun',
      release: circular,
      optics: { model: 'constant', qpr: 1 },
    });
    expect(again.id).not.toBe(run.id);
    expect(again.resultSha256).toBe(run.resultSha256);
  });
});

describe('a run with Mie optics', () => {
  let mie: RunItem;
  beforeAll(async () => {
    const catalogue = await uploaded(member, {
      file: 'radius_um,density_g_cm3,material\n0.3,3.3,astrosil\n0.1,1.8,carbon_be\n5,1.8,carbon_be\n',
    });
    mie = await ran(member, {
      catalogueId: catalogue.id,
      starSlug: 'sun',
      release: circular,
      optics: { model: 'mie' },
      disc: { opticalDepth: 1e-3 },
      charging: { potentialV: 5, fieldNT: 3 },
    });
  });

  test('meets the independent Planck means of the same optical constants', async () => {
    const { items } = await json<{ items: RunGrainItem[] }>(call(getGrains, { as: member, params: { id: mie.id } }));
    // Independent implementation of the oscillator models, averaged over a 5772 K black body (checks.json, mean-qpr-*).
    expect(items[0].qpr / 1.3046004321278875).toBeCloseTo(1, 3);
    expect(items[1].qpr / 1.7598876518598106).toBeCloseTo(1, 3);
    expect(items[0]).toMatchObject({ fate: 'unbound', regime: 'unbound' });
    // P/(4 pi tau) at 1 au: 79.579 yr (checks.json, tcoll-disc).
    expect(items[2]).toMatchObject({ fate: 'bound', regime: 'collisions', collisionTimeYr: expect.closeTo(79.579, 3) });
    expect(items[2].temperatureK).toBeGreaterThan(200);
    expect(items[1].lorentzRatio).toBeGreaterThan(items[2].lorentzRatio ?? Infinity);
  });

  test('names the radii at which grains of each material become unbound', () => {
    const [carbon, silicate] = mie.summary?.perMaterial ?? [];
    expect([carbon.material, silicate.material]).toEqual(['carbon_be', 'astrosil']);
    expect(carbon.unboundIntervalsUm).toHaveLength(1);
    expect(carbon.unboundIntervalsUm[0][0]).toBe(0);
    expect(silicate.unboundIntervalsUm[0][0]).toBeGreaterThan(0);
  });

  test('draws the curves it used, as the calculator gives them', async () => {
    const { curves } = await json<RunCurves>(call(getCurves, { as: member, params: { id: mie.id } }));
    const answer = await json<CurveAnswer>(
      call(postCurve, { as: member, json: { slug: 'astrosil', starSlug: 'sun', radiiUm: curves[1].radiiUm } }),
    );
    expect(answer.beta).toEqual(curves[1].beta);
    expect(answer.unboundIntervalsUm).toEqual(mie.summary?.perMaterial[1].unboundIntervalsUm);
  });
});
