import { fileURLToPath } from 'node:url';
import type { Endpoint } from '@/src/web/endpoint';

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

/** The handler that serves a line of the contract, found by its path: a line without a file fails. */
export async function handlerOf({ method, path }: Endpoint): Promise<Handler> {
  const folder = path.replaceAll(/\{(\w+)\}/g, '[$1]');
  const file = fileURLToPath(new URL(`../../app/api/v1${folder}/route.ts`, import.meta.url));
  const module = (await import(/* @vite-ignore */ file)) as Record<string, Handler | undefined>;
  const handler = module[method.toUpperCase()];
  if (!handler) throw new Error(`${path} does not answer ${method}`);
  return handler;
}
