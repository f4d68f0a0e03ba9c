import { isSameProcess } from './living-process.mjs';
import { npmAncestors } from './npm-ancestors.mjs';

/** npm passes a signal on to its shell, which ends without telling us: so we look whether both are still there. */
export function whenNpmEnds(action) {
  const ancestors = npmAncestors();
  if (ancestors.length === 0) return;
  const watch = setInterval(() => {
    if (ancestors.every(isSameProcess)) return;
    clearInterval(watch);
    action();
  }, 500);
  watch.unref();
}
