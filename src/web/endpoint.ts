import type { z } from 'zod';
import type { LimitName } from './rate-limit';

/** One line of the API's contract: what it takes, what it gives. OpenAPI and the tests are made from these. */
export type Endpoint = {
  method: 'get' | 'post' | 'delete';
  /** Below /api/v1, with {name} for parameters. */
  path: string;
  summary: string;
  params?: z.ZodObject;
  query?: z.ZodObject;
  body?: z.ZodType;
  /** What a form upload holds, for the document only: the handler reads the stream itself. */
  form?: z.ZodObject;
  reply: z.ZodType | 'text/csv' | 'application/octet-stream';
  status?: 200 | 201 | 202 | 204;
  limit?: LimitName;
};
