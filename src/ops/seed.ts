import { randomBytes } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Catalogue, Membership, Person, ResearchGroup, Run } from '@/entities';
import { demo } from '@/fixtures/demo';
import { receiveCatalogue } from '@/src/catalogues/receive-catalogue';
import { spool } from '@/src/catalogues/spool';
import { closeOrm, forkEm } from '@/src/db';
import { env } from '@/src/env';
import { actorOfEmail } from '@/src/people/actor-of-email';
import { hashPassword, passwordMatches } from '@/src/people/passwords';
import { requestRun } from '@/src/runs/request-run';

const stateDir = env().CHAFFLINE_STATE_DIR;
const factsFile = join(stateDir, 'demo.json');
const longestCheckMs = 120_000;

/** The demonstration: an invented laboratory with people in each role, two catalogues and a run of each. Idempotent. */
async function seed(): Promise<void> {
  const em = await forkEm();
  const password = await demoPassword();
  await seedPeople(em.fork(), password);
  for (const wanted of demo.catalogues) {
    const catalogueId = await seedCatalogue(em.fork(), wanted);
    await seedRun(em.fork(), catalogueId, wanted);
  }
  await keepFacts(password);
}

async function demoPassword(): Promise<string> {
  const kept = await readFile(factsFile, 'utf8').then(
    (text) => (JSON.parse(text) as { demoPassword?: string }).demoPassword,
    () => undefined,
  );
  return kept ?? `winnow-${randomBytes(9).toString('base64url')}`;
}

async function seedPeople(em: EntityManager, password: string): Promise<void> {
  const group =
    (await em.findOne(ResearchGroup, { name: demo.groupName })) ?? em.create(ResearchGroup, { name: demo.groupName });
  for (const { name, email, role } of Object.values(demo.people)) {
    const person = await withPassword(em, name, email, password);
    const member = await em.findOne(Membership, { person, group });
    if (!member) em.create(Membership, { person, group, role });
  }
  const admin = await withPassword(em, demo.admin.name, demo.admin.email, password);
  admin.platformRole = 'admin';
  await em.flush();
}

async function withPassword(em: EntityManager, name: string, email: string, password: string): Promise<Person> {
  const person = await em.findOne(Person, { email });
  if (person && (await passwordMatches(password, person.passwordHash))) return person;
  const passwordHash = await hashPassword(password);
  if (person) return em.assign(person, { passwordHash });
  return em.create(Person, { name, email, passwordHash, emailVerifiedAt: new Date() });
}

type DemoCatalogue = (typeof demo.catalogues)[number];

async function seedCatalogue(em: EntityManager, { name, file }: DemoCatalogue): Promise<string> {
  const actor = await actorOfEmail(em, demo.people.demoResearcher.email);
  const there = await em.findOne(Catalogue, { name, group: actor.groupId!, status: { $ne: 'failed' } });
  const id = there?.id ?? (await upload());
  await untilReady(em, id);
  return id;

  async function upload(): Promise<string> {
    const source = createReadStream(join('fixtures', 'catalogues', file));
    const spooled = await spool(source, join(stateDir, 'uploads'), 64 * 1024 * 1024);
    try {
      const settings = { mapping: null, defaults: {}, onInvalidRows: 'refuse' } as const;
      return (await receiveCatalogue(em, actor, { file: spooled, fileName: file, name, ...settings })).id;
    } finally {
      await spooled.remove();
    }
  }
}

async function untilReady(em: EntityManager, id: string): Promise<void> {
  const deadline = Date.now() + longestCheckMs;
  while (Date.now() < deadline) {
    const { status, failure } = await em.fork().findOneOrFail(Catalogue, { id });
    if (status === 'ready') return;
    if (status === 'failed') throw new Error(`The demonstration catalogue was refused: ${failure}`);
    await new Promise((resume) => setTimeout(resume, 200));
  }
  throw new Error('The demonstration catalogue was not checked in time: does a worker run?');
}

async function seedRun(
  em: EntityManager,
  catalogueId: string,
  { run: name, star, eccentricity }: DemoCatalogue,
): Promise<void> {
  const actor = await actorOfEmail(em, demo.people.demoResearcher.email);
  const there = await em.findOne(Run, { name, catalogue: catalogueId, status: { $in: ['queued', 'running', 'done'] } });
  if (there) return;
  await requestRun(em, actor, {
    catalogueId,
    name,
    starSlug: star,
    release: { distanceAu: 1, eccentricity, at: 'pericentre' },
    optics: { model: 'mie' },
  });
}

async function keepFacts(demoPassword: string): Promise<void> {
  const emails = Object.fromEntries(Object.entries(demo.people).map(([key, { email }]) => [key, email]));
  await mkdir(stateDir, { recursive: true });
  const facts = { ...emails, demoAdmin: demo.admin.email, demoPassword };
  await writeFile(`${factsFile}.new`, `${JSON.stringify(facts, null, 2)}\n`, { mode: 0o600 });
  await rename(`${factsFile}.new`, factsFile);
}

try {
  await seed();
} finally {
  await closeOrm();
}
