import { openApiDocument } from '@/src/web/openapi';

export const GET = (): Response =>
  Response.json(openApiDocument(), { headers: { 'cache-control': 'public, max-age=300' } });
