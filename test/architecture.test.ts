import { readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';

const root = fileURLToPath(new URL('..', import.meta.url));
const areas = ['catalogues', 'runs', 'stars', 'materials', 'people', 'sharing', 'studies', 'audit', 'mail'];

/** What areas stand on, beside physics, access and entities: errors, environment, log, queue, claims, and the COPY writer. */
const ground = ['src/errors', 'src/env', 'src/log', 'src/queue', 'src/claim', 'src/copy', 'src/csv-line'];

const sources = ['app', 'src', 'entities', 'migrations', 'fixtures'].flatMap((folder) =>
  filesBelow(join(root, folder)),
);

function filesBelow(folder: string): string[] {
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name);
    if (statSync(path).isDirectory()) return filesBelow(path);
    return /\.(ts|tsx|mjs)$/.test(name) ? [relative(root, path)] : [];
  });
}

type Import = { from: string; to: string; isType: boolean };

/** Imports of one file: our own as paths from the root, packages by name. */
function importsOf(file: string): Import[] {
  const text = readFileSync(join(root, file), 'utf8');
  const found = text.matchAll(
    /^\s*(?:import|export)\s+(type\s+)?(?:[^'";]*?\sfrom\s+)?'([^']+)'|\bimport\(\s*'([^']+)'\s*\)/gm,
  );
  return [...found].map(([, type, fixed, dynamic]) => ({
    from: file,
    to: target(file, fixed ?? dynamic),
    isType: type !== undefined,
  }));
}

function target(file: string, specifier: string): string {
  if (specifier.startsWith('@/')) return specifier.slice(2);
  if (specifier.startsWith('.')) return relative(root, resolve(root, dirname(file), specifier));
  return specifier;
}

const imports = sources.flatMap(importsOf);
const within = (path: string, ...folders: string[]) =>
  folders.some((folder) => path === folder || path.startsWith(`${folder}/`));
const isOurs = (path: string) => within(path, 'app', 'src', 'entities', 'migrations', 'fixtures');
const show = ({ from, to }: Import) => `${from} -> ${to}`;

/** Imports of files in `folder` that are not allowed. */
function strays(folder: string, isAllowed: (to: string, one: Import) => boolean): string[] {
  return imports.filter((one) => within(one.from, folder) && !isAllowed(one.to, one)).map(show);
}

describe('directions', () => {
  test('are read from real files', () => {
    expect(sources.length).toBeGreaterThan(200);
    expect(imports.length).toBeGreaterThan(800);
  });

  test('physics imports itself, and distributions from jstat', () => {
    expect(strays('src/physics', (to) => within(to, 'src/physics') || to === 'jstat')).toEqual([]);
  });

  test('entities import entities', () => {
    expect(
      strays('entities', (to) => within(to, 'entities') || to === '@mikro-orm/core' || to === 'node:crypto'),
    ).toEqual([]);
  });

  test.each(areas.map((area) => `src/${area}`).filter((folder) => sources.some((file) => within(file, folder))))(
    '%s imports what areas may',
    (folder) => {
      const allowed = ['src/physics', 'src/access', 'entities', ...ground, ...areas.map((area) => `src/${area}`)];
      const isFixture = (to: string, { isType }: Import) => isType && within(to, 'fixtures');
      const isForbiddenPackage = (to: string) => /^(next|react|server-only)(\/|$)/.test(to);
      expect(
        strays(folder, (to, one) =>
          isOurs(to) ? within(to, ...allowed) || isFixture(to, one) : !isForbiddenPackage(to),
        ),
      ).toEqual([]);
    },
  );

  test('areas do not go in circles', () => {
    const areaOf = (path: string) => areas.find((area) => within(path, `src/${area}`));
    const edges = new Map<string, Set<string>>(areas.map((area) => [area, new Set()]));
    for (const { from, to, isType } of imports) {
      const [a, b] = [areaOf(from), areaOf(to)];
      if (a && b && a !== b && !isType && !to.endsWith('schema')) edges.get(a)?.add(b);
    }
    const circle = (area: string, path: string[]): string[] | undefined => {
      if (path.includes(area)) return [...path, area];
      for (const next of edges.get(area) ?? []) {
        const found = circle(next, [...path, area]);
        if (found) return found;
      }
      return undefined;
    };
    for (const area of areas) expect(circle(area, [])).toBeUndefined();
  });

  test('access stands on entities and errors', () => {
    expect(strays('src/access', (to) => !isOurs(to) || within(to, 'src/access', 'entities', 'src/errors'))).toEqual([]);
  });

  test('web wraps: access, database, errors, people for who is asking, and schemas of the areas', () => {
    const isSchema = (to: string) => /schema$|query$|mapping$/.test(to);
    // A link that was shared is a way of asking, too.
    const allowed = [
      'src/web',
      'src/access',
      'src/people',
      'src/sharing/open-share',
      'src/db',
      'src/errors',
      'src/env',
      'src/log',
    ];
    expect(strays('src/web', (to) => !isOurs(to) || within(to, ...allowed) || isSchema(to))).toEqual([]);
  });

  test('the worker calls areas; never next, never app', () => {
    const allowed = ['src/worker', ...ground, 'src/db', 'src/abandoned-work', ...areas.map((area) => `src/${area}`)];
    expect(
      strays('src/worker', (to) => (isOurs(to) ? within(to, ...allowed) : !/^(next|react)(\/|$)/.test(to))),
    ).toEqual([]);
  });

  test('components know physics, schemas and types; never the database', () => {
    const isHarmless = (to: string, { isType }: Import) =>
      isType || within(to, 'src/ui', 'src/physics') || /schema$|mapping$|preview-catalogue$/.test(to);
    expect(strays('src/ui', (to, one) => !isOurs(to) || isHarmless(to, one))).toEqual([]);
  });

  test('files for the browser do not reach the database, not even through others', () => {
    const isServerOnly = (to: string) =>
      within(to, 'src/db', 'src/queue', 'src/web/page', 'src/web/route', 'src/web/action') ||
      /^(pg|pg-boss|@mikro-orm|node:)/.test(to);
    const clients = sources.filter(
      (file) => file.endsWith('.tsx') && readFileSync(join(root, file), 'utf8').startsWith("'use client'"),
    );
    expect(clients.length).toBeGreaterThan(20);
    const byFile = grouped();
    const reached = (file: string, seen: Set<string>, path: string[]): string[] | undefined => {
      if (seen.has(file)) return undefined;
      seen.add(file);
      for (const { to, isType } of byFile.get(file) ?? []) {
        if (isType || to.endsWith('/actions') || to.endsWith('sign-out')) continue;
        if (isServerOnly(to)) return [...path, file, to];
        const next = [to, `${to}.ts`, `${to}.tsx`, `${to}/index.ts`].find((candidate) => byFile.has(candidate));
        const found = next && reached(next, seen, [...path, file]);
        if (found) return found;
      }
      return undefined;
    };
    for (const client of clients) expect(reached(client, new Set(), [])).toBeUndefined();
  });

  test('app calls operations: it does not open the database itself, but for accounts and health', () => {
    const exempt = ['app/(account)', 'app/health', 'app/(app)/account'];
    expect(strays('app', (to, { from }) => to !== 'src/db' || within(from, ...exempt))).toEqual([]);
  });

  test('nothing outside src/ops imports src/ops', () => {
    expect(imports.filter(({ from, to }) => within(to, 'src/ops') && !within(from, 'src/ops')).map(show)).toEqual([]);
  });
});

function grouped(): Map<string, Import[]> {
  const groups = new Map<string, Import[]>();
  for (const one of imports) groups.set(one.from, [...(groups.get(one.from) ?? []), one]);
  return groups;
}

describe('the house', () => {
  test('has no drawers for odds and ends', () => {
    expect(
      sources.filter((file) => /(^|\/)(utils?|helpers?|common|lib|services?|misc)(\/|\.tsx?$)/.test(file)),
    ).toEqual([]);
  });

  test('has small files', () => {
    const lines = sources
      .filter((file) => !within(file, 'migrations'))
      .map((file) => readFileSync(join(root, file), 'utf8').split('\n').length);
    lines.sort((a, b) => a - b);
    const quantile = (share: number) => lines[Math.floor(share * (lines.length - 1))];
    console.log(`lines per file: median ${quantile(0.5)}, 90 % ${quantile(0.9)}, most ${lines.at(-1)}`);
    expect(quantile(0.5)).toBeLessThanOrEqual(60);
    expect(quantile(0.9)).toBeLessThanOrEqual(150);
    expect(lines.at(-1)).toBeLessThanOrEqual(300);
  });

  test('leaves nothing for later and hides nothing', () => {
    const marks = /\bTODO\b|\bFIXME\b|@ts-ignore|@ts-expect-error|\bas any\b|: any\b/;
    expect(sources.filter((file) => marks.test(readFileSync(join(root, file), 'utf8')))).toEqual([]);
  });
});
