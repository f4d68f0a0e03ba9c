import { readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { GET as getOpenApi } from '@/app/api/v1/openapi.json/route';
import { contract } from '@/src/web/contract';
import type { Endpoint } from '@/src/web/endpoint';
import { handlerOf } from './handlers';

const endpoints = Object.values(contract) as Endpoint[];
const root = new URL('../../app/api/v1/', import.meta.url);

describe('the contract', () => {
  test.each(endpoints.map((endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const))(
    '%s has a handler',
    async (_, endpoint) => {
      expect(await handlerOf(endpoint)).toBeTypeOf('function');
    },
  );

  test('names every route file there is', () => {
    const files = readdirSync(root, { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('route.ts'));
    const paths = files.map((file) => `/${file.replace(/\/route\.ts$/, '').replaceAll(/\[(\w+)\]/g, '{$1}')}`);
    const known = new Set([...endpoints.map(({ path }) => path), '/openapi.json', '/[...unknown]']);
    expect(paths.filter((path) => !known.has(path))).toEqual([]);
  });

  test('is published as OpenAPI 3.1 with every path, and without unresolved references', async () => {
    const document = (await getOpenApi().json()) as {
      openapi: string;
      paths: Record<string, Record<string, { responses: object }>>;
    };
    expect(document.openapi).toBe('3.1.0');
    for (const { method, path, status } of endpoints) {
      expect(Object.keys(document.paths[path][method].responses)).toContain(String(status ?? 200));
    }
    expect(JSON.stringify(document)).not.toContain('"$ref":"#/components/schemas/undefined');
  });
});
