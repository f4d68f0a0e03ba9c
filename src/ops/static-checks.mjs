import { nodeExitCode } from './run-node.mjs';
import { say } from './say.mjs';

const checks = [
  { name: 'TypeScript', args: ['node_modules/typescript/bin/tsc', '--noEmit'] },
  { name: 'ESLint', args: ['node_modules/eslint/bin/eslint.js', '.'] },
];

/** Reads the code without running it; answers how many of the checks failed. */
export async function runStaticChecks() {
  const codes = await Promise.all(checks.map(({ args }) => nodeExitCode(args)));
  const failed = checks.filter((_, at) => codes[at] !== 0);
  for (const { name } of failed) say(`${name} found errors (see above)`);
  return failed.length;
}
