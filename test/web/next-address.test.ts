import { expect, test } from 'vitest';
import { nextAddress } from '@/src/web/next-address';

test.each(['/runs', '/invitation/abc?x=1#y', '/'])('%s is one of ours', (address) =>
  expect(nextAddress(address)).toBe(address),
);

test.each([
  '//evil.example',
  '/\\evil.example',
  'https://evil.example',
  'javascript:alert(1)',
  '',
  undefined,
  '/a\nb',
  ['/x'],
])('ASVS 3.7.2: %s leads home', (address) => expect(nextAddress(address)).toBe('/home'));
