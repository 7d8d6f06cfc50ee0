import { problem } from '@linkfell/contracts';
import { z } from 'zod';

import type { RouteDescription } from './routes.js';

type Json = Record<string, unknown>;

/** OpenAPI 3.1 takes JSON Schema 2020-12 as it is; what JSON Schema cannot say (a custom check) is left open. */
const jsonSchema = (schema: z.ZodType, io: 'input' | 'output'): Json => {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any', reused: 'inline' });
  return rest;
};

const jsonBody = (schema: Json): Json => ({ 'application/json': { schema } });

const reads = new Set(['GET', 'HEAD']);

function parameters(route: RouteDescription): Json[] {
  const path = [...route.path.matchAll(/:(\w+)/g)].map(([, name = '']) => ({
    name,
    in: 'path',
    required: true,
    schema: route.params[name] ? jsonSchema(route.params[name], 'input') : { type: 'string' },
  }));
  const query = route.query ? jsonSchema(route.query, 'input') : {};
  const required = (query.required ?? []) as string[];
  const queries = Object.entries((query.properties ?? {}) as Record<string, Json>).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
  const header = (name: string) => ({ name, in: 'header', required: true, schema: { type: 'string' } });
  const machine = route.access?.kind === 'public' && route.body === null && !reads.has(route.method);
  return [
    ...path,
    ...queries,
    ...(reads.has(route.method) || machine ? [] : [header('X-Linkfell-Csrf')]),
    ...(route.idempotent ? [header('Idempotency-Key')] : []),
  ];
}

function operation(route: RouteDescription): Json {
  const { answers, access } = route;
  const status = String(answers?.status ?? 200);
  const open = access === null || access.kind === 'public';
  return {
    operationId: route.handler,
    tags: [route.path.split('/')[2] ?? 'operations'],
    'x-access': access,
    security: open ? [] : [{ session: [] }],
    parameters: parameters(route),
    ...(route.body && {
      requestBody: { required: true, content: jsonBody(jsonSchema(route.body, 'input')) },
    }),
    responses: {
      [status]: {
        description: 'Done',
        ...(answers?.schema && { content: jsonBody(jsonSchema(answers.schema, 'output')) }),
      },
      default: { $ref: '#/components/responses/Problem' },
    },
  };
}

/** The HTTP API as an OpenAPI 3.1 document, made from the very schemas that check requests and answers. */
export function openApiDocument(
  routes: readonly RouteDescription[],
  options: { url: string; cookie: string },
): Json {
  const paths: Record<string, Json> = {};
  for (const route of routes) {
    const template = route.path.replace(/:(\w+)/g, '{$1}');
    paths[template] = { ...paths[template], [route.method.toLowerCase()]: operation(route) };
  }
  return {
    openapi: '3.1.0',
    jsonSchemaDialect: 'https://json-schema.org/draft/2020-12/schema',
    info: {
      title: 'Linkfell',
      version: '1',
      description: 'Lengths in mm, money in minor units with VAT, instants in ISO 8601.',
    },
    servers: [{ url: options.url }],
    paths,
    components: {
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: options.cookie } },
      responses: {
        Problem: {
          description: 'What went wrong, as RFC 9457 problem details',
          content: { 'application/problem+json': { schema: jsonSchema(problem, 'output') } },
        },
      },
    },
  };
}
