import { closeOrm, forkEm } from '@/src/db';
import { actorOfEmail } from '@/src/people/actor-of-email';
import { makeToken } from '@/src/people/tokens';

/** npm run token -- <e-mail>: the last line printed is a fresh personal token. */
const [email] = process.argv.slice(2);
if (!email) {
  console.error('Usage: npm run token -- <e-mail>');
  process.exit(2);
}
try {
  const em = await forkEm();
  const actor = await actorOfEmail(em, email);
  const { token, expiresAt } = await makeToken(em, actor, {
    name: 'command line',
    scopes: ['read', 'write'],
    expiresInDays: 30,
  });
  console.log(`For ${actor.name}, group ${actor.groupName}, valid until ${expiresAt.toISOString()}:`);
  console.log(token);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
} finally {
  await closeOrm();
}
