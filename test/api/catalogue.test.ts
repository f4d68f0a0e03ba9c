import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { POST } from '@/app/api/v1/catalogues/route';
import { GET as getGrains } from '@/app/api/v1/catalogues/[id]/grains/route';
import { GET as getOriginal } from '@/app/api/v1/catalogues/[id]/original/route';
import { GET as getRejects } from '@/app/api/v1/catalogues/[id]/rejects/route';
import { GET as getRejectsCsv } from '@/app/api/v1/catalogues/[id]/rejects.csv/route';
import { Catalogue, Grain, Reject } from '@/entities';
import type { CatalogueGrainItem, CatalogueItem, RejectItem } from '@/src/catalogues/schema';
import { forkEm } from '@/src/db';
import { call, json } from './call';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { uploaded, uploadForm } from './upload';

withOwnDatabase();

let member: Member;
beforeAll(async () => {
  member = await newMember(await newGroup(), 'researcher');
});

const withBadRows =
  'radius_um,density_g_cm3,material,label\n1,2.5,astrosil,a\n-1,2.5,astrosil,b\n2,2.5,unobtainium,c\n3,2.5,ice,=cmd\n';

describe('a catalogue without fault', () => {
  const file =
    'label,diameter_nm,density_kg_m3,material,count\nfirst,500,2500,silicate,3\nsecond,1000,917,Water ice,1\n';
  let catalogue: CatalogueItem;
  beforeAll(async () => {
    catalogue = await uploaded(member, { file, name: 'Two grains' });
  });

  test('is ready, counted and digested', () => {
    expect(catalogue).toMatchObject({
      name: 'Two grains',
      status: 'ready',
      failure: null,
      rows: { accepted: 2, rejected: 0, blank: 0 },
    });
    expect(catalogue.sha256).toBe(createHash('sha256').update(file).digest('hex'));
    expect(catalogue.materials).toEqual([
      { material: 'astrosil', grains: 1 },
      { material: 'water_ice', grains: 1 },
    ]);
  });

  test('has its units converted once, at the door', async () => {
    const { items } = await json<{ items: CatalogueGrainItem[] }>(
      call(getGrains, { as: member, params: { id: catalogue.id }, query: { sort: 'radiusUm', order: 'desc' } }),
    );
    expect(
      items.map(({ label, radiusUm, densityGCm3, material, count, line }) => [
        label,
        radiusUm,
        densityGCm3,
        material,
        count,
        line,
      ]),
    ).toEqual([
      ['second', 0.5, 0.917, 'water_ice', 1, 3],
      ['first', 0.25, 2.5, 'astrosil', 3, 2],
    ]);
  });

  test('is given back byte for byte', async () => {
    const response = await call(getOriginal, { as: member, params: { id: catalogue.id } });
    expect(Buffer.from(await response.arrayBuffer()).toString()).toBe(file);
    expect(response.headers.get('content-disposition')).toContain('grains.csv');
  });

  test('of several megabytes keeps its bytes, too', async () => {
    const many = `radius_um,density_g_cm3,material\n${'1.25,2.5,astrosil\n'.repeat(90_000)}`;
    const large = await uploaded(member, { file: many });
    expect(large.rows.accepted).toBe(90_000);
    const response = await call(getOriginal, { as: member, params: { id: large.id } });
    expect(
      createHash('sha256')
        .update(Buffer.from(await response.arrayBuffer()))
        .digest('hex'),
    ).toBe(large.sha256);
  });
});

describe('a catalogue with bad rows', () => {
  test('is refused, keeps the list of reasons and not a single grain', async () => {
    const catalogue = await uploaded(member, { file: withBadRows });
    expect(catalogue).toMatchObject({ status: 'failed', rows: { rejected: 2 } });
    expect(catalogue.failure).toMatch(/2 rows are not valid/);
    const { items, total } = await json<{ items: RejectItem[]; total: number }>(
      call(getRejects, { as: member, params: { id: catalogue.id } }),
    );
    expect(total).toBe(2);
    expect(items[0]).toMatchObject({ line: 3, column: 'radius_um', value: '-1' });
    expect(items[1]).toMatchObject({ line: 4, column: 'material', value: 'unobtainium' });
    expect(await (await forkEm()).count(Grain, { catalogue: catalogue.id })).toBe(0);
  });

  test('goes on without them when the person says so', async () => {
    const catalogue = await uploaded(member, { file: withBadRows, onInvalidRows: 'leaveOut' });
    expect(catalogue).toMatchObject({ status: 'ready', rows: { accepted: 2, rejected: 2 } });
  });

  test('lists them as CSV that no spreadsheet runs', async () => {
    const catalogue = await uploaded(member, { file: 'radius_um,density_g_cm3,material\n=1+1,2.5,astrosil\n' });
    const csv = await (await call(getRejectsCsv, { as: member, params: { id: catalogue.id } })).text();
    expect(csv).toMatch(/^line,column,value,reason,row\r\n2,radius_um,'=1\+1,/);
  });
});

describe('a file that cannot be read', () => {
  const awkward = (name: string) =>
    new Uint8Array(readFileSync(new URL(`../../fixtures/catalogues/awkward/${name}`, import.meta.url)));
  test.each([
    ['picture.bin', /PNG image/],
    ['only-comments.csv', /./],
    ['header-only.csv', /./],
    ['decimal-commas.csv', /decimal commas/],
    ['missing-density-column.csv', /density/i],
    ['missing-size-column.csv', /radius|diameter|mass/i],
    ['duplicate-headers.csv', /both called/],
    ['nul-bytes.csv', /./],
    ['unclosed-quote.csv', /quotation mark/],
  ])('%s fails with a sentence and stores no grain', async (name, sentence) => {
    const catalogue = await uploaded(member, { file: awkward(name) });
    expect(catalogue.status).toBe('failed');
    expect(catalogue.failure).toMatch(sentence);
    const em = await forkEm();
    expect(await em.count(Grain, { catalogue: catalogue.id })).toBe(0);
    const kept = await json<CatalogueItem>(
      (await import('@/app/api/v1/catalogues/[id]/route')).GET(
        new Request('http://localhost/', { headers: { authorization: `Bearer ${member.token}` } }),
        { params: Promise.resolve({ id: catalogue.id }) },
      ),
    );
    expect(kept.failure).toBe(catalogue.failure);
  });

  test('with an empty body is refused at the door and leaves nothing', async () => {
    const before = await (await forkEm()).count(Catalogue, {});
    const problem = await json(call(POST, { as: member, form: uploadForm({ file: '' }) }), 400);
    expect(problem).toMatchObject({ title: 'The request is not valid', errors: [{ pointer: '/file' }] });
    expect(await (await forkEm()).count(Catalogue, {})).toBe(before);
  });

  test('UTF-16, a byte-order mark and semicolons are understood', async () => {
    for (const name of ['utf-16-little-endian.csv', 'byte-order-mark.csv', 'semicolons.csv']) {
      expect((await uploaded(member, { file: awkward(name) })).failure).toBeNull();
    }
  });
});

describe('the upload form', () => {
  test.each([
    ['no name', uploadForm({ name: '  ' }), '/name'],
    ['a mapping that is no JSON', uploadForm({ mapping: '{' as unknown as object }), '/mapping'],
    ['a rule that does not exist', uploadForm({ onInvalidRows: 'guess' }), '/onInvalidRows'],
    ['a density that is no density', uploadForm({ defaults: { densityGCm3: -1 } }), '/defaults/densityGCm3'],
  ])('with %s is refused and points at the field', async (_, form, pointer) => {
    const problem = await json<{ errors: { pointer: string }[] }>(call(POST, { as: member, form }), 400);
    expect(problem.errors.map((error) => error.pointer)).toContain(pointer);
  });

  test('without a file, or not as a form at all, is refused', async () => {
    const form = new FormData();
    form.set('name', 'x');
    await json(call(POST, { as: member, form }), 400);
    await json(call(POST, { as: member, json: { name: 'x' } }), 415);
  });

  test('that breaks off stores nothing', async () => {
    const before = await (await forkEm()).count(Catalogue, {});
    const body = '--x\r\ncontent-disposition: form-data; name="file"; filename="a.csv"\r\n\r\nradius_um,dens';
    const request = new Request('http://localhost/api/v1/catalogues', {
      method: 'POST',
      body,
      headers: { authorization: `Bearer ${member.token}`, 'content-type': 'multipart/form-data; boundary=x' },
    });
    const problem = await json(POST(request, { params: Promise.resolve({}) }), 400);
    expect(problem.detail).toMatch(/broke off/);
    expect(await (await forkEm()).count(Catalogue, {})).toBe(before);
  });

  test.each([
    ['words as headers have them', { Size: 'diameter_um', Rho: 'density_g_cm3', Comp: 'material' }],
    [
      'fields and units',
      {
        Size: { field: 'diameter', unit: 'um' },
        Rho: { field: 'density', unit: 'g_cm3' },
        Comp: { field: 'material' },
      },
    ],
  ])('may tell columns by %s', async (_, mapping) => {
    const catalogue = await uploaded(member, { file: 'Size,Rho,Comp\n2,3,ice\n', mapping });
    expect(catalogue).toMatchObject({ status: 'ready', failure: null });
  });

  test('may say what columns hold and what rows lack', async () => {
    const file = 'Size,Comp\n2,x\n';
    const catalogue = await uploaded(member, {
      file,
      mapping: { Size: { field: 'diameter', unit: 'um' }, Comp: { field: 'ignore' } },
      defaults: { densityGCm3: 3, material: 'astrosil' },
    });
    expect(catalogue).toMatchObject({ status: 'ready', materials: [{ material: 'astrosil', grains: 1 }] });
  });
});

test('rejects of a failed catalogue stay with it', async () => {
  const catalogue = await uploaded(member, { file: withBadRows });
  expect(await (await forkEm()).count(Reject, { catalogue: catalogue.id })).toBe(2);
});
