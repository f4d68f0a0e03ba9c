import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { fingerprint } from '@/src/ops/fingerprint.mjs';

let base: string;

beforeEach(() => {
  base = mkdtempSync(join(tmpdir(), 'chaffline-fingerprint-'));
  mkdirSync(join(base, 'app'));
  writeFileSync(join(base, 'app', 'page.tsx'), 'one');
});

afterEach(() => rmSync(base, { recursive: true }));

const print = () => fingerprint(base, ['app', 'absent']);

test('a file that was only touched leaves the build current', () => {
  const before = print();
  utimesSync(join(base, 'app', 'page.tsx'), 0, 0);
  expect(print()).toBe(before);
});

test('changed, added, renamed and moved content each make the build stale', () => {
  const seen = new Set([print()]);
  writeFileSync(join(base, 'app', 'page.tsx'), 'two');
  seen.add(print());
  writeFileSync(join(base, 'app', 'layout.tsx'), '');
  seen.add(print());
  rmSync(join(base, 'app', 'layout.tsx'));
  writeFileSync(join(base, 'app', 'other.tsx'), '');
  seen.add(print());
  writeFileSync(join(base, 'app', 'page.tsx'), '');
  writeFileSync(join(base, 'app', 'other.tsx'), 'two');
  seen.add(print());
  expect(seen.size).toBe(5);
});

test('what is left out does not count', () => {
  const withoutPage = () => fingerprint(base, ['app'], (path) => path === 'app/page.tsx');
  const before = withoutPage();
  writeFileSync(join(base, 'app', 'page.tsx'), 'two');
  expect(withoutPage()).toBe(before);
});
