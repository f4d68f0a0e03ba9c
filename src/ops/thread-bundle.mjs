import { inLocal, inRoot, root } from './places.mjs';
import { readIfThere, writeWhole } from './whole-file.mjs';

const source = inRoot('src', 'runs', 'curve-thread.ts');
const target = inLocal('build', 'curve-thread.mjs');

/** Threads are started by path, so the code of theirs is bundled for plain Node. It takes milliseconds, so it is done always. */
export async function bundleThread() {
  const { build, stop } = await import('esbuild'); // only there once the packages are
  const { outputFiles } = await build({
    entryPoints: [source],
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    packages: 'external',
    alias: { '@': root },
    write: false,
    logLevel: 'warning',
  });
  await stop(); // its process would stay as long as ours
  const code = outputFiles[0].text;
  if (readIfThere(target) !== code) writeWhole(target, code);
}
