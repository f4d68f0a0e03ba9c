import { expect, test } from 'vitest';
import { isInstalled } from '@/src/ops/node-packages.mjs';

const lock = {
  packages: {
    '': {},
    'node_modules/a': { version: '1.0.0' },
    'node_modules/for-another-system': { version: '2.0.0', optional: true },
  },
};

test('an installation without npm’s closing record was not finished', () => {
  expect(isInstalled(lock, undefined)).toBe(false);
});

test('packages for other systems may be missing', () => {
  expect(isInstalled(lock, { packages: { 'node_modules/a': { version: '1.0.0' } } })).toBe(true);
});

test('a missing or different version has to be installed', () => {
  expect(isInstalled(lock, { packages: {} })).toBe(false);
  expect(isInstalled(lock, { packages: { 'node_modules/a': { version: '1.0.1' } } })).toBe(false);
});
