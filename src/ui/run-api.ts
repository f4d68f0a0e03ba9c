export type ApiFieldProblem = { pointer?: string; row?: number; column?: string; detail: string };

/** What the API refused, in its own words. */
export class ApiProblem extends Error {
  override name = 'ApiProblem';
  constructor(
    readonly status: number,
    message: string,
    readonly fields: ApiFieldProblem[] = [],
  ) {
    super(message);
  }
}

export function apiGet<T>(path: string, signal?: AbortSignal): Promise<T> {
  return answer<T>(fetch(path, { headers: { accept: 'application/json' }, signal }));
}

export function apiPost<T>(path: string, body?: unknown, signal?: AbortSignal): Promise<T> {
  const sent =
    body === undefined ? {} : { headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) };
  return answer<T>(fetch(path, { method: 'POST', signal, ...sent }));
}

export async function apiDelete(path: string): Promise<void> {
  const response = await fetch(path, { method: 'DELETE' });
  if (!response.ok) throw await problemOf(response);
}

async function answer<T>(asked: Promise<Response>): Promise<T> {
  const response = await asked;
  if (response.ok) return (await response.json()) as T;
  throw await problemOf(response);
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const isProblem = response.headers.get('content-type')?.includes('application/problem+json');
  if (!isProblem)
    return new ApiProblem(response.status, 'The server did not answer as expected. Try again in a moment.');
  const { detail, errors } = (await response.json()) as { detail: string; errors?: ApiFieldProblem[] };
  return new ApiProblem(response.status, detail, errors);
}

/** One sentence for the person, also when the network itself failed. */
export function sayProblem(error: unknown): string {
  return error instanceof ApiProblem
    ? error.message
    : 'The server could not be reached. Check the connection and try again.';
}

/** Asking again helps against a broken connection or a busy server, not against a refusal. */
export function worthAskingAgain(failures: number, error: unknown): boolean {
  return failures < 3 && !(error instanceof ApiProblem && error.status < 500);
}
