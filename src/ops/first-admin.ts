import { Person } from '@/entities';
import { recordChange } from '@/src/audit/record-change';
import { closeOrm, forkEm } from '@/src/db';

/** npm run first-admin -- <e-mail>: makes a person who has signed up the first administrator. Works once. */
const [email] = process.argv.slice(2);
if (!email) {
  console.error('Usage: npm run first-admin -- <e-mail of a person who has signed up>');
  process.exit(2);
}
try {
  const outcome = await (
    await forkEm()
  ).transactional(async (tx) => {
    await tx.execute('select pg_advisory_xact_lock(20261201)');
    if ((await tx.count(Person, { platformRole: 'admin' })) > 0)
      return 'There is an administrator already: administrators make others.';
    const person = await tx.findOne(Person, { email: email.trim().toLowerCase(), disabledAt: null });
    if (!person) return `Nobody has signed up as ${email}.`;
    person.platformRole = 'admin';
    recordChange(
      tx,
      { personId: null, name: 'first-admin command' },
      { action: 'admin.first', target: { kind: 'person', id: person.id, name: person.name }, groupId: null },
    );
    return null;
  });
  if (outcome === null) console.log(`${email} is the first administrator.`);
  else {
    console.error(outcome);
    process.exitCode = 1;
  }
} finally {
  await closeOrm();
}
