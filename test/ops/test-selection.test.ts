import { expect, test } from 'vitest';
import { choosesBrowserTests } from '@/src/ops/test-selection.mjs';

const browserFiles = ['test/e2e/upload.test.ts', 'test/e2e/sign-in.test.ts'];

test.each([
  [[], true],
  [['test/physics'], false],
  [['test/e2e'], true],
  [['upload'], true],
  [['test/physics', 'sign-in'], true],
  [['--project', 'unit'], false],
  [['--project=api'], false],
  [['--project', 'unit', '--project', 'e2e'], true],
])('arguments %j need the browser: %s', (args, expected) => {
  expect(choosesBrowserTests(args, browserFiles)).toBe(expected);
});
