import type { Member } from './people';

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;
type Asked = {
  as?: Pick<Member, 'token'>;
  params?: Record<string, string>;
  query?: Record<string, string>;
  json?: unknown;
  form?: FormData;
  headers?: Record<string, string>;
  method?: string;
};

/** Calls a route handler as the web server would. */
export function call(
  handler: Handler,
  { as, params = {}, query = {}, json, form, headers = {}, method }: Asked = {},
): Promise<Response> {
  const url = `http://localhost/api/v1/x?${new URLSearchParams(query)}`;
  const body = form ?? (json === undefined ? undefined : JSON.stringify(json));
  const request = new Request(url, {
    method: method ?? (body === undefined ? 'GET' : 'POST'),
    body,
    headers: {
      ...(as ? { authorization: `Bearer ${as.token}` } : {}),
      ...(json === undefined ? {} : { 'content-type': 'application/json' }),
      ...headers,
    },
  });
  return handler(request, { params: Promise.resolve(params) });
}

export async function json<T = Record<string, unknown>>(
  response: Promise<Response> | Response,
  status = 200,
): Promise<T> {
  const answered = await response;
  const text = await answered.text();
  if (answered.status !== status) throw new Error(`expected ${status}, got ${answered.status}: ${text}`);
  return JSON.parse(text) as T;
}
