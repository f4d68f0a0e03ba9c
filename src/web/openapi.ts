import {
  OpenAPIRegistry,
  OpenApiGeneratorV31,
  extendZodWithOpenApi,
  type ResponseConfig,
  type RouteConfig,
} from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { contract } from './contract';
import type { Endpoint } from './endpoint';
import { problemSchema } from './problem';

extendZodWithOpenApi(z);

let made: object | undefined;

/** OpenAPI 3.1, made from the same schemas that the routes parse with. */
export function openApiDocument(): object {
  made ??= make();
  return made;
}

function make(): object {
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', 'personalToken', { type: 'http', scheme: 'bearer' });
  registry.registerComponent('securitySchemes', 'session', { type: 'apiKey', in: 'cookie', name: '__Host-session' });
  for (const [operationId, endpoint] of Object.entries(contract)) registry.registerPath(pathOf(operationId, endpoint));
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: {
      title: 'Chaffline',
      version: '1',
      description:
        'Which grains does starlight blow out? Numbers carry their unit in the name. Errors are application/problem+json (RFC 9457). Lists are paged by cursor.',
    },
    servers: [{ url: '/api/v1' }],
    security: [{ personalToken: [] }, { session: [] }],
  });
}

function pathOf(operationId: string, endpoint: Endpoint): RouteConfig {
  const { method, path, summary, params, query, body, form, status = 200 } = endpoint;
  const content = body
    ? { content: { 'application/json': { schema: body } }, required: true }
    : form && { content: { 'multipart/form-data': { schema: form } }, required: true };
  const problem: ResponseConfig = {
    description: 'Refused, with the reason',
    content: { 'application/problem+json': { schema: problemSchema } },
  };
  return {
    method,
    path,
    operationId,
    summary,
    request: { ...(params ? { params } : {}), ...(query ? { query } : {}), ...(content ? { body: content } : {}) },
    responses: { [status]: replyOf(endpoint), default: problem },
  };
}

function replyOf({ reply, status }: Endpoint): ResponseConfig {
  if (status === 204) return { description: 'Done' };
  if (typeof reply === 'string') return { description: 'A file', content: { [reply]: { schema: { type: 'string' } } } };
  return { description: 'As asked', content: { 'application/json': { schema: reply } } };
}
