import { ensureBuild, isBuilt } from './build.mjs';
import { tryLock } from './exclusive.mjs';

async function productRuns() {
  const release = await tryLock('product');
  await release?.();
  return !release;
}

/** A build of the present sources; a running product keeps its own, older one under its feet. */
export async function ensureTestBuild() {
  const dir = !isBuilt('.next') && (await productRuns()) ? '.next-test' : '.next';
  await ensureBuild(dir);
  return dir;
}
