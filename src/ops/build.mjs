import { rmSync, existsSync } from 'node:fs';
import { bundleThread } from './thread-bundle.mjs';
import { exclusively } from './exclusive.mjs';
import { Failure } from './failure.mjs';
import { fingerprint } from './fingerprint.mjs';
import { inRoot, logFile, root } from './places.mjs';
import { readIfThere, writeWhole } from './whole-file.mjs';
import { runNodeOrFail } from './run-node.mjs';
import { say } from './say.mjs';

const sources = [
  ...['app', 'src', 'entities', 'migrations', 'fixtures', 'public', 'package-lock.json', 'tsconfig.json'],
  ...['mikro-orm.config.ts', 'next.config.mjs', 'postcss.config.mjs', 'instrumentation.ts', 'proxy.ts'],
];
const notInTheBuild = new Set(['src/ops', 'src/worker']);

const sourcePrint = () => fingerprint(root, sources, (path) => notInTheBuild.has(path));
const stampFile = (dir) => inRoot(dir, 'chaffline-sources');

/** True when the build in `dir` was finished and made of exactly the present sources. */
export const isBuilt = (dir) => readIfThere(stampFile(dir)) === sourcePrint();

async function buildInto(dir) {
  await bundleThread();
  const print = sourcePrint();
  if (readIfThere(stampFile(dir)) === print) return false;
  rmSync(stampFile(dir), { force: true }); // from here on, until it is written again, there is no finished build
  const log = logFile('build');
  const env = {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    CHAFFLINE_NEXT_DIR: dir,
  };
  await runNodeOrFail('The web application could not be built', ['node_modules/next/dist/bin/next', 'build'], {
    env,
    log,
  });
  if (!existsSync(inRoot(dir, 'BUILD_ID'))) throw new Failure(`The build left nothing in ${dir}.`, log);
  writeWhole(stampFile(dir), print);
  return true;
}

/** Builds the web application when its sources changed. True when it had to work. */
export function ensureBuild(dir = '.next') {
  return exclusively(
    'build',
    () => buildInto(dir),
    () => say('Another command is building: waiting'),
  );
}
