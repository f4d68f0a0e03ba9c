import { createHash } from 'node:crypto';
import { readFileSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';

function* filesBelow(base, path, isLeftOut) {
  const there = statSync(join(base, path), { throwIfNoEntry: false });
  if (!there || isLeftOut(path)) return;
  if (!there.isDirectory()) yield path;
  else for (const name of readdirSync(join(base, path)).sort()) yield* filesBelow(base, join(path, name), isLeftOut);
}

/** One hash over names and contents, the same wherever the checkout lies and whenever its files were written. */
export function fingerprint(base, paths, isLeftOut = (_path) => false) {
  const hash = createHash('sha256');
  for (const path of paths) {
    for (const file of filesBelow(base, path, isLeftOut)) {
      const content = readFileSync(join(base, file));
      hash.update(`${file}\0${content.length}\0`).update(content);
    }
  }
  return hash.digest('hex');
}
