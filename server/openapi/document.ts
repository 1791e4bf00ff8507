import { OpenAPIRegistry, OpenApiGeneratorV31 } from '@asteasolutions/zod-to-openapi';
import type { RouteConfig } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { problemSchema } from '@/shared/problem';
import { COOKIE_NAME } from '../session';
import { API_ROUTES } from './routes';
import type { ApiRoute } from './routes';

type Responses = RouteConfig['responses'];
type Parameters = NonNullable<RouteConfig['parameters']>;
type Schema = Record<string, unknown>;

/** JSON Schema, which is what OpenAPI 3.1 speaks. What a client sends and what it gets differ where a schema converts. */
function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Schema {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}

const PROBLEM = {
  description: 'A problem document, RFC 9457',
  content: { 'application/problem+json': { schema: schemaOf(problemSchema, 'output') } },
};

function success({ answer, status = answer === undefined ? 204 : 200 }: ApiRoute): Responses {
  if (answer === undefined) return { 204: { description: 'Done' } };
  if (typeof answer === 'string') {
    const schema = { type: 'string' as const, format: 'binary' };
    return { [status]: { description: 'The file', content: { [answer]: { schema } } } };
  }
  const content = { 'application/json': { schema: schemaOf(answer, 'output') } };
  const done = { [status]: { description: status === 201 ? 'Created' : 'Done', content } };
  // The same id from the same person is the same creation.
  return status === 201 ? { ...done, 200: { description: 'Known already', content } } : done;
}

function parametersOf({ path, query, ifMatch }: ApiRoute): Parameters {
  const text = { type: 'string' as const };
  const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name = '']) => name);
  const inQuery = query === undefined ? {} : schemaOf(query, 'input')['properties'];
  return [
    ...inPath.map((name) => ({ name, in: 'path' as const, required: true, schema: text })),
    ...Object.entries(inQuery ?? {}).map(([name, schema]: [string, Schema]) => ({
      name,
      in: 'query' as const,
      required: false,
      schema,
    })),
    ...(ifMatch === undefined
      ? []
      : [{ name: 'If-Match', in: 'header' as const, required: true, schema: text }]),
  ];
}

function requestOf({ body, upload }: ApiRoute): RouteConfig['request'] {
  const file = z.strictObject({ file: z.file(), caption: z.string(), section: z.string() });
  if (upload !== undefined) {
    return { body: { content: { 'multipart/form-data': { schema: schemaOf(file, 'input') } } } };
  }
  if (body === undefined) return {};
  return { body: { content: { 'application/json': { schema: schemaOf(body, 'input') } } } };
}

/** The interface in OpenAPI 3.1, from the schemas that the server parses with. */
function buildDocument() {
  const registry = new OpenAPIRegistry();
  const cookie = registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: COOKIE_NAME,
  });
  for (const route of API_ROUTES) {
    registry.registerPath({
      method: route.method,
      path: `/api${route.path}`,
      summary: route.summary,
      security: route.open === undefined ? [{ [cookie.name]: [] }] : [],
      parameters: parametersOf(route),
      request: requestOf(route),
      responses: { ...success(route), default: PROBLEM },
    });
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'Wideberth', version: '1.0.0' },
  });
}

let document: ReturnType<typeof buildDocument> | undefined;

/** The same for the life of the process, made when first asked for. */
export function openApiDocument() {
  document ??= buildDocument();
  return document;
}
