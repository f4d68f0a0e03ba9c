import { describeFailure, exitWithFailure } from './failure.mjs';
import { endLeftovers } from './product-record.mjs';
import { ensureLocalDir } from './local-dir.mjs';
import { product } from './product.mjs';
import { say } from './say.mjs';
import { sayWhereItRuns } from './running-product.mjs';
import { whenNpmEnds } from './end-with-npm.mjs';
import { tryLock } from './exclusive.mjs';

/** Stays in the foreground until it is told to stop. One product per checkout. */
export async function runProduct(modeName) {
  ensureLocalDir();
  let release = await tryLock('product');
  while (!release) {
    if (await sayWhereItRuns()) return;
    release = await tryLock('product');
  }
  if ((await endLeftovers()) > 0) say('Ended what an earlier start had left behind');

  let ending;
  const end = (exitCode) => (ending ??= chaffline.stop().then(() => process.exit(exitCode), exitWithFailure));
  const endWith = (error) => {
    if (!ending) console.error(describeFailure(error));
    return end(1);
  };
  const endCalmly = () => {
    if (!ending) say('Stopping');
    void end(0);
  };
  const chaffline = product(modeName, endWith);
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, endCalmly);
  whenNpmEnds(endCalmly);
  await chaffline.start().catch(endWith);
}
