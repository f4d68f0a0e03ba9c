import { defineConfig, globalIgnores } from 'eslint/config';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';

export default defineConfig([
  ...nextVitals,
  ...nextTypescript,
  { rules: { '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }] } },
  // Rules of pages mean nothing in tests.
  { files: ['test/**'], rules: { '@next/next/no-assign-module-variable': 'off' } },
  globalIgnores(['.next/**', '.next-test/**', '.local/**', 'next-env.d.ts']),
]);
