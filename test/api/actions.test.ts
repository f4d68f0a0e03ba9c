import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, test, vi } from 'vitest';
import { Membership, Session } from '@/entities';
import { forkEm } from '@/src/db';
import { invite } from '@/src/people/invite';
import { startSession } from '@/src/people/sessions';
import { draftNewStar } from '@/src/stars/draft-star';
import type { FormState } from '@/src/web/form-state';
import { withOwnDatabase } from './own-database';
import { newGroup, newMember, type Member } from './people';
import { circular } from './runs';
import { uploaded } from './upload';

/** The request that an action is called in: a jar with one session, or none. */
const request = vi.hoisted(() => ({ secret: undefined as string | undefined }));

vi.mock('server-only', () => ({}));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));
vi.mock('next/server', () => ({ connection: async () => undefined }));
vi.mock('next/headers', () => ({
  cookies: async () => ({
    get: (name: string) => (request.secret && name === '__Host-session' ? { value: request.secret } : undefined),
    set: () => undefined,
    delete: () => undefined,
  }),
  headers: async () => new Headers({ 'user-agent': 'a test' }),
}));
vi.mock('next/navigation', () => ({
  redirect: (to: string) => {
    throw new Error(`redirect ${to}`);
  },
  notFound: () => {
    throw new Error('not found');
  },
}));

withOwnDatabase();

type Who = 'pi' | 'researcher' | 'student' | 'other' | 'nobody';
type Outcome = 'done' | 'refused' | 'sign in';
type Action = (state: FormState, form: FormData) => Promise<FormState & Record<string, unknown>>;
type Row = {
  form?: () => Promise<Record<string, string>> | Record<string, string>;
  outcomes: Partial<Record<Who, Outcome>>;
};

const people: Partial<Record<Who, Member>> = {};
let groupId: string;
let catalogueId: string;
let made = 0;

beforeAll(async () => {
  process.env.CHAFFLINE_SECRET = 'a secret for tests alone, of thirty-two characters and more';
  groupId = await newGroup();
  for (const role of ['pi', 'researcher', 'student'] as const) people[role] = await newMember(groupId, role);
  people.other = await newMember(await newGroup(), 'pi');
  catalogueId = (await uploaded(people.researcher!)).id;
});

const linkTo = (path: string) => `http://localhost${path}`;
const star = () => ({
  slug: `star${++made}`,
  owner: 'group',
  name: 'S',
  massSun: '1',
  luminositySun: '1',
  teffK: '5772',
  radiusSun: '',
  citation: 'a test',
  note: '',
});
const draft = async () => {
  const { massSun: _m, ...words } = star();
  const numbers = { massSun: 1, luminositySun: 1, teffK: 5772, radiusSun: undefined };
  return draftNewStar(await forkEm(), people.pi!.actor, { ...words, ...numbers, owner: 'group' });
};
const spare = async () => (await newMember(groupId, 'student')).actor.personId;
const run = () => ({
  request: JSON.stringify({ catalogueId, starSlug: 'sun', release: circular, optics: { model: 'constant', qpr: 1 } }),
});

const onlyPi = { pi: 'done', researcher: 'refused', student: 'refused', other: 'refused', nobody: 'sign in' } as const;
const anybody = { pi: 'done', researcher: 'done', student: 'done', other: 'done', nobody: 'sign in' } as const;
const ofTheGroup = { pi: 'done', researcher: 'done', student: 'done', other: 'refused', nobody: 'sign in' } as const;
const refusedToAll = {
  pi: 'refused',
  researcher: 'refused',
  student: 'refused',
  other: 'refused',
  nobody: 'sign in',
} as const;
const open = (outcome: Outcome) => ({ pi: outcome, other: outcome, nobody: outcome });

/** Every server action there is, and who may: an action without a row fails. What needs one's own password or link is refused without it. */
const table: Record<string, Row> = {
  requestRunAction: { form: run, outcomes: ofTheGroup },
  inviteAction: {
    form: () => ({ email: `a${++made}@example.org`, role: 'student' }),
    outcomes: { ...onlyPi, other: 'done' },
  },
  revokeInvitationAction: {
    form: async () => ({
      id: (await invite(await forkEm(), people.pi!.actor, { email: `b${++made}@example.org`, role: 'student' }, linkTo))
        .id,
    }),
    outcomes: onlyPi,
  },
  changeRoleAction: { form: async () => ({ personId: await spare(), role: 'researcher' }), outcomes: onlyPi },
  removeMemberAction: { form: async () => ({ personId: await spare() }), outcomes: onlyPi },
  renameGroupAction: { form: () => ({ name: 'Renamed' }), outcomes: { ...onlyPi, other: 'done' } },
  createGroupAction: { form: () => ({ name: 'Further' }), outcomes: anybody },
  enterGroupAction: { form: () => ({ groupId }), outcomes: ofTheGroup },
  leaveGroupAction: { outcomes: { pi: 'refused', other: 'refused', nobody: 'sign in' } },
  makeTokenAction: { form: () => ({ name: 't', access: 'read', expiresInDays: '1' }), outcomes: anybody },
  revokeTokenAction: { form: () => ({ id: '00000000-0000-4000-8000-000000000000' }), outcomes: refusedToAll },
  changePasswordAction: {
    form: () => ({ oldPassword: 'not it', password: 'a long new password' }),
    outcomes: refusedToAll,
  },
  endSessionAction: { form: () => ({ id: 'a'.repeat(64) }), outcomes: refusedToAll },
  sendVerificationAction: { outcomes: { nobody: 'sign in' } },
  draftNewStarAction: { form: star, outcomes: { ...onlyPi, other: 'done' } },
  draftNextVersionAction: { form: () => ({ slug: 'sun' }), outcomes: refusedToAll },
  editDraftAction: {
    form: async () => ({ ...star(), slug: '', owner: '', id: (await draft()).id }),
    outcomes: { researcher: 'refused', student: 'refused', other: 'refused', nobody: 'sign in' },
  },
  publishStarAction: { form: async () => ({ id: (await draft()).id }), outcomes: onlyPi },
  retireStarAction: { form: async () => ({ id: (await draft()).id }), outcomes: refusedToAll },
  signInAction: {
    form: () => ({ email: 'nobody@example.org', password: 'not a password', next: '/' }),
    outcomes: open('refused'),
  },
  signUpAction: {
    form: () => ({ name: 'N', email: `c${++made}@example.org`, password: 'grains drift away', groupName: 'G' }),
    outcomes: open('done'),
  },
  forgottenAction: { form: () => ({ email: `d${++made}@example.org` }), outcomes: open('done') },
  resetPasswordAction: {
    form: () => ({ secret: 'unknown', password: 'a long new password' }),
    outcomes: open('refused'),
  },
  verifyAddressAction: { form: () => ({ secret: 'unknown' }), outcomes: open('refused') },
  acceptInvitationAction: { form: () => ({ secret: 'unknown' }), outcomes: refusedToAll },
  acceptAsNewPersonAction: {
    form: () => ({ secret: `unknown${++made}`, name: 'N', password: 'grains drift away' }),
    outcomes: open('refused'),
  },
  unlockAction: { form: () => ({ secret: 'unknown', passphrase: 'unknown' }), outcomes: open('refused') },
};

const app = fileURLToPath(new URL('../../app/', import.meta.url));
const files = readdirSync(app, { recursive: true, encoding: 'utf8' }).filter((file) => /(^|\/)actions\.ts$/.test(file));

async function actions(): Promise<Record<string, Action>> {
  const modules = await Promise.all(
    files.map((file) => import(/* @vite-ignore */ app + file) as Promise<Record<string, unknown>>),
  );
  return Object.fromEntries(
    modules.flatMap((module) => Object.entries(module).filter(([name]) => name.endsWith('Action'))),
  ) as Record<string, Action>;
}

/** A session of its own for each call: some actions end the one they are called in. */
async function newSession(who: Who): Promise<string | undefined> {
  const actor = people[who]?.actor;
  return actor && startSession(await forkEm(), actor.personId, actor.groupId, '');
}

async function outcomeOf(action: Action, fields: Record<string, string>, secret: string | undefined): Promise<Outcome> {
  request.secret = secret;
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  try {
    const { message, problems } = await action({}, form);
    return message !== undefined || problems !== undefined ? 'refused' : 'done';
  } catch (error) {
    const text = (error as Error).message;
    if (text === 'redirect /sign-in') return 'sign in';
    if (text.startsWith('redirect ')) return 'done';
    throw error;
  }
}

const cases = Object.entries(table).flatMap(([name, { outcomes }]) =>
  Object.entries(outcomes).map(([who, outcome]) => [name, who as Who, outcome] as const),
);

describe('every server action', () => {
  test('has a row in the table', async () => {
    expect(Object.keys(await actions()).sort()).toEqual(Object.keys(table).sort());
  });

  test.each(cases)('%s by %s: %s', async (name, who, outcome) => {
    const fields = (await table[name].form?.()) ?? {};
    expect(await outcomeOf((await actions())[name], fields, await newSession(who))).toBe(outcome);
  });
});

test('a session that ended a moment ago opens no action', async () => {
  const secret = await newSession('student');
  await (await forkEm()).nativeDelete(Session, { person: people.student!.actor.personId });
  expect(await outcomeOf((await actions()).requestRunAction, run(), secret)).toBe('sign in');
});

test('a person who was removed a moment ago cannot request a run any more', async () => {
  const secret = await newSession('researcher');
  const { personId } = people.researcher!.actor;
  await (await forkEm()).nativeDelete(Membership, { person: personId, group: groupId });
  expect(await outcomeOf((await actions()).requestRunAction, run(), secret)).toBe('refused');
});
