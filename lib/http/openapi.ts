import { z } from 'zod';
import { type Action, permissions } from '@/lib/auth/permissions';
import { version } from '@/lib/version';

export interface DescribedHandler {
  description?: { action: Action[]; params?: z.ZodType; query?: z.ZodType; body?: z.ZodType; needsVersion?: boolean };
}

/** Path as the framework writes it (`/api/sheets/[id]`) → handlers by method. */
export type DescribedRoutes = Record<
  string,
  Partial<Record<'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE', DescribedHandler>>
>;

const schemaOf = (schema: z.ZodType) =>
  z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any', target: 'draft-2020-12' });

const problem = {
  description: 'A problem, RFC 9457',
  content: {
    'application/problem+json': {
      schema: {
        type: 'object',
        required: ['type', 'title', 'status', 'detail'],
        properties: {
          type: { type: 'string' },
          title: { type: 'string' },
          status: { type: 'integer' },
          detail: { type: 'string' },
          instance: { type: 'string' },
          errors: {
            type: 'array',
            items: {
              type: 'object',
              required: ['pointer', 'detail'],
              properties: { pointer: { type: 'string' }, detail: { type: 'string' } },
            },
          },
        },
      },
    },
  },
};

/** OpenAPI 3.1 out of the schemas that the routes themselves parse with. */
export function openApiDocument(routes: DescribedRoutes): Record<string, unknown> {
  return {
    openapi: '3.1.0',
    info: {
      title: 'Witnessmark',
      version,
      description: 'Decimals are strings, times RFC 3339 in UTC, errors application/problem+json.',
    },
    paths: Object.fromEntries(
      Object.entries(routes).map(([path, handlers]) => [
        path.replace(/\[([^\]]+)\]/g, '{$1}'),
        Object.fromEntries(
          methodsOf(handlers).map(([method, handler]) => [method.toLowerCase(), operation(path, method, handler)]),
        ),
      ]),
    ),
    components: {
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'next-auth.session-token' } },
    },
  };
}

const open: NonNullable<DescribedHandler['description']> = { action: [] };

const methods = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;

/** A route's module exports other things too: only methods count. */
const methodsOf = (handlers: DescribedRoutes[string]) =>
  methods.flatMap((method) => (handlers[method] ? [[method, handlers[method]] as const] : []));

function operation(path: string, method: string, { description = open }: DescribedHandler): Record<string, unknown> {
  const inPath = [...path.matchAll(/\[([^\]]+)\]/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }));
  return {
    summary:
      description.action.map((action) => permissions[action].means).join('; or ') ||
      'open to everybody, limited by address',
    ...(description.action.length > 0 ? { security: [{ session: [] }] } : {}),
    parameters: [...inPath, ...queryParameters(description.query), ...headerParameters(method, description)],
    ...(description.body
      ? { requestBody: { required: true, content: { 'application/json': { schema: schemaOf(description.body) } } } }
      : {}),
    responses: { '2XX': { description: 'Done' }, '4XX': problem, '5XX': problem },
  };
}

function queryParameters(query: z.ZodType | undefined) {
  if (!query) return [];
  const { properties = {}, required = [] } = schemaOf(query) as {
    properties?: Record<string, unknown>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
}

function headerParameters(method: string, description: NonNullable<DescribedHandler['description']>) {
  const header = (name: string, required: boolean) => ({ name, in: 'header', required, schema: { type: 'string' } });
  return [
    ...(description.needsVersion ? [header('If-Match', true)] : []),
    ...(method === 'POST' && description.action.length > 0 ? [header('Idempotency-Key', false)] : []),
  ];
}
