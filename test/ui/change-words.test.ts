import { readFileSync, readdirSync } from 'node:fs';
import { expect, test } from 'vitest';
import { changeWords } from '@/src/ui/change-words';

const root = new URL('../../src/', import.meta.url);

test('every action that is recorded has words', () => {
  const files = readdirSync(root, { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('.ts'));
  const actions = files.flatMap((file) => {
    const text = readFileSync(new URL(file, root), 'utf8');
    return text.includes('recordChange')
      ? [...text.matchAll(/'((?:account|admin|catalogue|group|run|share|star|token)\.[a-zA-Z]+)'/g)].map(
          ([, action]) => action,
        )
      : [];
  });
  const permissions = /\.(read|manage\w*|upload|compute)$/;
  const recorded = actions.filter((action) => !permissions.test(action) || action === 'catalogue.upload');
  expect(recorded.length).toBeGreaterThan(20);
  expect(recorded.filter((action) => changeWords(action) === action)).toEqual([]);
});
