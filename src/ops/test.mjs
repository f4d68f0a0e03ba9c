import { rmSync } from 'node:fs';
import { countLine, countTests } from './count-line.mjs';
import { choosesBrowserTests } from './test-selection.mjs';
import { describeFailure } from './failure.mjs';
import { endNodeChildren } from './node-child.mjs';
import { ensureChromium } from './chromium.mjs';
import { ensurePackages } from './node-packages.mjs';
import { ensurePostgres } from './postgres.mjs';
import { ensureTestBuild } from './test-build.mjs';
import { exclusively } from './exclusive.mjs';
import { bundleThread } from './thread-bundle.mjs';
import { inLocal } from './places.mjs';
import { nodeExitCode } from './run-node.mjs';
import { readJsonIfThere } from './whole-file.mjs';
import { runStaticChecks } from './static-checks.mjs';
import { say, step } from './say.mjs';

const results = inLocal('test', 'results.json');

/** What only the tests in a browser need; when it cannot be had, the other tests are run all the same. */
async function prepareBrowserTests() {
  try {
    await step('Browser is in place', ensureChromium);
    return { nextDir: await step((dir) => `Build is current in ${dir}`, ensureTestBuild), failures: 0 };
  } catch (error) {
    say(describeFailure(error));
    return { nextDir: undefined, failures: 1 };
  }
}

async function runVitest(args, databaseUrl, browser) {
  rmSync(results, { force: true });
  const { NODE_ENV: _, ...callers } = process.env; // vitest sets its own
  const env = { ...callers, DATABASE_URL: databaseUrl, NEXT_TELEMETRY_DISABLED: '1' };
  if (browser.nextDir) env.CHAFFLINE_NEXT_DIR = browser.nextDir;
  const projects = browser.failures > 0 ? ['--project', 'unit', '--project', 'api'] : [];
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${results}`];
  const exitCode = await nodeExitCode(['node_modules/vitest/vitest.mjs', 'run', ...reporters, ...projects, ...args], {
    env,
  });
  return countTests(readJsonIfThere(results), exitCode);
}

async function testEverything(args) {
  await step('Packages are in place', ensurePackages);
  const postgres = await step('PostgreSQL is running', ensurePostgres);
  try {
    const browser = choosesBrowserTests(args) ? await prepareBrowserTests() : { failures: 0 };
    await bundleThread();
    const checksFailed = args.length === 0 ? await step('Code was checked', runStaticChecks) : 0;
    const { passed, failed } = await runVitest(args, postgres.databaseUrl, browser);
    return { passed, failed: failed + checksFailed + browser.failures };
  } finally {
    await postgres.stop();
  }
}

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, endNodeChildren);

const counts = await exclusively(
  'test',
  () => testEverything(process.argv.slice(2)),
  () => say('Another command is testing: waiting'),
).catch((error) => {
  say(describeFailure(error));
  return { passed: 0, failed: 1 };
});
say(countLine(counts));
process.exitCode = counts.failed === 0 ? 0 : 1;
