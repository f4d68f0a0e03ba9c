import { readdirSync } from 'node:fs';
import { inRoot } from './places.mjs';

const browserTests = 'test/e2e/';

/** Whether arguments of vitest choose tests in a browser: vitest takes each plain one as a part of a path. */
export function choosesBrowserTests(args, files = filesOfBrowserTests()) {
  const projects = args.flatMap((arg, at) => projectOf(arg, args[at + 1]));
  if (projects.length > 0 && !projects.some((name) => name === 'e2e' || name.includes('*'))) return false;
  const filters = args.filter((arg, at) => !arg.startsWith('-') && args[at - 1] !== '--project');
  return filters.length === 0 || files.some((file) => filters.some((filter) => file.includes(filter)));
}

function projectOf(arg, next) {
  if (arg === '--project') return [next];
  return arg.startsWith('--project=') ? [arg.slice('--project='.length)] : [];
}

const filesOfBrowserTests = () =>
  readdirSync(inRoot(browserTests), { recursive: true }).map((name) => `${browserTests}${name}`);
