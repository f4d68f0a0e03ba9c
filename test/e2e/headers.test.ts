import { describe, expect, inject, test } from 'vitest';

const get = (path: string, init?: RequestInit) =>
  fetch(new URL(path, inject('productUrl')), { redirect: 'manual', ...init });

describe('answers of the product', () => {
  test.each(['/', '/sign-in', '/api/v1/openapi.json', '/health/live'])(
    '%s carry the security headers',
    async (path) => {
      const { headers } = await get(path);
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('x-frame-options')).toBe('DENY');
      expect(headers.get('referrer-policy')).toBe('same-origin');
      expect(headers.get('strict-transport-security')).toMatch(/max-age=31536000/);
      expect(headers.get('x-powered-by')).toBeNull();
      expect(headers.get('access-control-allow-origin')).toBeNull();
    },
  );

  test('pages have a policy with a nonce of their own and nothing unsafe', async () => {
    const [first, second] = await Promise.all([get('/'), get('/')]);
    const policies = [first, second].map(({ headers }) => headers.get('content-security-policy') ?? '');
    expect(policies[0]).toMatch(/script-src 'self' 'nonce-[^']+' 'strict-dynamic'/);
    expect(policies[0]).toContain("object-src 'none'");
    expect(policies[0]).toContain("frame-ancestors 'none'");
    expect(policies[0]).not.toMatch(/unsafe-/);
    expect(policies[0]).not.toBe(policies[1]);
  });

  test('are problem documents for what the API does not have', async () => {
    const response = await get('/api/v1/nothing/here');
    expect([response.status, response.headers.get('content-type')]).toEqual([
      404,
      'application/problem+json; charset=utf-8',
    ]);
  });

  test('tell health without internals', async () => {
    expect(await (await get('/health/live')).json()).toEqual({ status: 'ok' });
    expect(await (await get('/health/ready')).json()).toEqual({ status: 'ok' });
  });

  test('send people who are not signed in to the sign-in page', async () => {
    const response = await get('/runs');
    expect(response.status).toBe(307);
    expect(response.headers.get('location')).toMatch(/\/sign-in$/);
  });
});
