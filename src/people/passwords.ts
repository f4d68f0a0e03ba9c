import { hash, verify, type Algorithm } from '@node-rs/argon2';
import { Refusal } from '@/src/errors';

const argon2id = 2 satisfies Algorithm.Argon2id;

/** OWASP's recommended setting with the most memory: 46 MiB, one pass, one lane. */
const parameters = { algorithm: argon2id, memoryCost: 47_104, timeCost: 1, parallelism: 1 };

const longestBytes = 256;

export async function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password, parameters));
}

/** Spends the same time when there is nobody to compare with, so that time does not tell who has an account. */
export async function passwordMatches(password: string, stored: string | undefined): Promise<boolean> {
  if (Buffer.byteLength(password) > longestBytes) return false;
  const matches = await inTurn(async () => verify(stored ?? (await nobodysHash()), password));
  return matches && stored !== undefined;
}

export function checkNewPassword(password: string): void {
  if ([...password].length < 12) throw refuse('Use at least 12 characters: a short sentence works well.');
  if (Buffer.byteLength(password) > longestBytes) throw refuse('Use at most 256 bytes.');
  if (new Set(password).size < 5) throw refuse('Use a less repetitive password.');
}

const refuse = (detail: string) => new Refusal('invalid', detail, [{ pointer: '/password', detail }]);

let nobody: Promise<string> | undefined;
const nobodysHash = () => (nobody ??= hash('the password of nobody', parameters));

/** Each hash takes 46 MiB: two at a time keep a flood of sign-ins from taking the memory of the process. */
let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= 2) await new Promise<void>((go) => waiting.push(go));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}
