import { randomUUID } from 'node:crypto';
import { z } from 'zod';
import { Refusal, type FieldProblem, type RefusalKind } from '@/src/errors';
import { log } from '@/src/log';

const titles: Record<RefusalKind, string> = {
  invalid: 'The request is not valid',
  unauthenticated: 'Not signed in',
  forbidden: 'Not allowed',
  notFound: 'Not found',
  conflict: 'Not possible now',
  tooLarge: 'Too large',
  unsupported: 'Not a supported content type',
  unprocessable: 'Cannot be processed',
  tooMany: 'Too many requests',
  unavailable: 'Not available now',
};

export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  instance: z.string(),
  errors: z
    .array(
      z.object({
        pointer: z.string().optional(),
        row: z.number().optional(),
        column: z.string().optional(),
        detail: z.string(),
      }),
    )
    .optional(),
});

export function refusalOfZod(error: z.ZodError, what: string): Refusal {
  const problems: FieldProblem[] = error.issues.map((issue) => ({
    pointer: '/' + issue.path.map(String).join('/'),
    detail: issue.message,
  }));
  const first = problems[0];
  return new Refusal(
    'invalid',
    `The ${what} is not valid: ${first?.pointer === '/' ? '' : `${first?.pointer} `}${first?.detail}.`,
    problems,
  );
}

/** RFC 9457. Surprises are logged with an id and shown as a calm line. */
export function problemResponse(error: unknown): Response {
  const instance = `urn:uuid:${randomUUID()}`;
  if (error instanceof Refusal) {
    return problem(
      error.status,
      error.kind,
      titles[error.kind],
      error.message,
      instance,
      error.problems,
      error.retryAfterS,
    );
  }
  log.error({ err: error, instance }, 'request failed');
  const detail = 'Something went wrong on our side. Try again; if it stays, tell the administrator the instance id.';
  return problem(500, 'internal', 'Unexpected error', detail, instance, []);
}

function problem(
  status: number,
  kind: string,
  title: string,
  detail: string,
  instance: string,
  errors: FieldProblem[],
  retryAfterS?: number,
): Response {
  const body = { type: `/problems/${kind}`, title, status, detail, instance, ...(errors.length ? { errors } : {}) };
  return new Response(JSON.stringify(body), {
    status,
    headers: {
      'content-type': 'application/problem+json; charset=utf-8',
      'cache-control': 'no-store',
      ...(retryAfterS === undefined ? {} : { 'retry-after': String(retryAfterS) }),
    },
  });
}
