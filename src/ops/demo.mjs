import { Failure } from './failure.mjs';
import { inLocal } from './places.mjs';
import { readJsonIfThere } from './whole-file.mjs';
import { say } from './say.mjs';

const file = inLocal('demo.json');
const people = {
  demoResearcher: 'researcher',
  demoStudent: 'student',
  demoPi: 'group head',
  demoAdmin: 'administrator',
};

/** The accounts that the seed made. */
export function demoAccounts() {
  const demo = readJsonIfThere(file);
  const missing = [...Object.keys(people), 'demoPassword'].filter((key) => !demo?.[key]);
  if (missing.length > 0) throw new Failure(`The demonstration data did not name ${missing.join(', ')} in ${file}.`);
  return Object.fromEntries([...Object.keys(people), 'demoPassword'].map((key) => [key, demo[key]]));
}

export function sayDemoAccounts(demo) {
  for (const [key, role] of Object.entries(people)) say(`  ${role.padEnd(13)} ${demo[key]}`);
  say(`  ${'password'.padEnd(13)} ${demo.demoPassword}`);
}
