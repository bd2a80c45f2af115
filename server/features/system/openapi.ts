import { z } from 'zod';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { problem } from '#shared/api/problem.ts';

const input = (schema: z.ZodType) => jsonSchema(schema, 'input');
const output = (schema: z.ZodType) => jsonSchema(schema, 'output');

function jsonSchema(schema: z.ZodType, io: 'input' | 'output') {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}

const problemAnswer = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
});

const described: Record<number, string> = {
  400: 'Malformed',
  401: 'Not signed in',
  403: 'Not allowed, or withheld',
  404: 'Not there, or not yours to see',
  409: 'Changed in the meantime, or already there',
  413: 'Too large',
  415: 'Wrong type',
  416: 'Range outside the file',
  422: 'Unreadable or invalid',
  429: 'Too often',
  500: 'Failed on our side',
  503: 'Busy',
};

/** The OpenAPI 3.1 document, generated from the schemas that check the requests. */
export function openapiDocument(version: string, serverUrl: string) {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const [operationId, endpoint] of Object.entries(endpoints) as [string, Endpoint][]) {
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [endpoint.method]: operation(operationId, endpoint) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Tallyloft',
      version,
      description:
        'Lengths mm, speeds mm/min and rev/min, power W, force N, time s; times ISO 8601 UTC. Numbers are starting points: machine and bit makers’ limits and local rules come first.',
      license: { name: 'AGPL-3.0-or-later', identifier: 'AGPL-3.0-or-later' },
    },
    servers: [{ url: serverUrl }],
    paths,
    components: {
      schemas: { Problem: output(problem) },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'tallyloft.session_token' } },
    },
  };
}

function operation(operationId: string, endpoint: Endpoint) {
  const inPath = [...endpoint.path.matchAll(/:(\w+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }));
  const body = requestBody(endpoint);
  const statuses = [400, ...(endpoint.who === 'all' ? [] : [401, 403]), 500, ...(endpoint.problems ?? [])];
  if (endpoint.body !== undefined) statuses.push(415, 422);
  return {
    operationId,
    summary: endpoint.summary,
    security: endpoint.who === 'all' ? [] : [{ session: [] }],
    parameters: [...inPath, ...queryParameters(endpoint), ...(endpoint.creates ? [idempotencyHeader] : [])],
    ...(body === undefined ? {} : { requestBody: body }),
    responses: {
      [endpoint.status]: goodAnswer(endpoint),
      ...Object.fromEntries(
        [...new Set(statuses)].sort().map((status) => [status, problemAnswer(described[status] ?? 'Error')]),
      ),
    },
  };
}

const idempotencyHeader = {
  name: 'Idempotency-Key',
  in: 'header',
  required: false,
  description: 'Repeating a request with the same key gets the same answer and creates nothing twice.',
  schema: { type: 'string', maxLength: 100 },
};

function queryParameters(endpoint: Endpoint) {
  if (endpoint.query === undefined) return [];
  const schema = input(endpoint.query) as { properties?: Record<string, unknown>; required?: string[] };
  return Object.entries(schema.properties ?? {}).map(([name, property]) => ({
    name,
    in: 'query',
    required: schema.required?.includes(name) ?? false,
    schema: property,
  }));
}

const uploaded = {
  drawing: { contentMediaType: 'image/svg+xml', description: 'One SVG file of at most 10 MB' },
  photo: { contentMediaType: 'image/*', description: 'One JPEG, PNG or WebP picture of at most 20 MB' },
};

function requestBody(endpoint: Endpoint) {
  if (endpoint.body !== undefined) {
    return { required: true, content: { 'application/json': { schema: input(endpoint.body) } } };
  }
  if (endpoint.multipart === undefined) return undefined;
  const parts = Object.entries(endpoint.multipart.parts);
  const schema = {
    type: 'object',
    required: ['file', ...endpoint.multipart.required],
    properties: {
      file: {
        type: 'string',
        ...uploaded[endpoint.multipart.file],
      },
      ...Object.fromEntries(parts.map(([name, part]) => [name, input(part)])),
    },
  };
  const encoding = Object.fromEntries(parts.map(([name]) => [name, { contentType: 'application/json' }]));
  return { required: true, content: { 'multipart/form-data': { schema, encoding } } };
}

function goodAnswer(endpoint: Endpoint) {
  const description = endpoint.status === 201 ? 'Created' : endpoint.status === 204 ? 'Done' : 'Good';
  if (endpoint.download !== undefined) {
    return { description: 'The file', content: { [endpoint.download]: {} } };
  }
  if (endpoint.answer === undefined) return { description };
  return { description, content: { 'application/json': { schema: output(endpoint.answer) } } };
}
