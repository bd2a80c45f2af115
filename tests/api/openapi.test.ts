import { Validator } from '@seriousme/openapi-schema-validator';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import * as vocabulary from '#shared/api/vocabulary.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { endpointNames, everyCall } from './support/every-call.ts';

type Schema = Parameters<typeof z.fromJSONSchema>[0];
type Content = Record<string, { schema?: Schema }>;
interface Operation {
  operationId: string;
  responses: Record<string, { content?: Content }>;
}
interface OpenapiDocument {
  openapi: string;
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: { Problem: Schema } };
}

let club: TestClub;
let owner: Person;
let administrator: Person;
let served: OpenapiDocument;
let calls: Awaited<ReturnType<typeof everyCall>>;

beforeAll(async () => {
  club = await testClub();
  owner = await club.person('Wren');
  administrator = await club.person('Ada', 'administrator');
  calls = await everyCall(club, owner, administrator);
  served = (await club.stranger.call('get', '/api/openapi.json').expect(200)).body as OpenapiDocument;
});
afterAll(() => club.close());

const operationOf = (name: keyof typeof endpoints): Operation => {
  const found = Object.values(served.paths)
    .flatMap((path) => Object.values(path))
    .find(({ operationId }) => operationId === name);
  if (found === undefined) throw new Error(`${name} is not in the document`);
  return found;
};

describe('the published contract', () => {
  it('is a valid OpenAPI 3.1 document', async () => {
    const validator = new Validator();
    const result = await validator.validate(served as unknown as Record<string, unknown>);
    expect(result.errors ?? []).toEqual([]);
    expect(result.valid).toBe(true);
    expect(validator.version).toBe('3.1');
  });

  it('lists every enum of the vocabulary in full', () => {
    const listed = new Set<string>();
    const collect = (value: unknown): void => {
      if (value === null || typeof value !== 'object') return;
      if ('enum' in value) listed.add(JSON.stringify(value.enum));
      for (const item of Object.values(value)) collect(item);
    };
    collect(served);
    const lists = Object.entries(vocabulary).filter(([, value]) => Array.isArray(value));
    expect(lists.length).toBeGreaterThan(8);
    for (const [name, values] of lists) {
      // Hazardous stock is no enum of its own: it is listed among all materials.
      const listedAs = name === 'hazardousMaterials' ? vocabulary.materials : values;
      expect([...listed], name).toContain(JSON.stringify(listedAs));
    }
  });

  const needsRole = ({ who }: Endpoint) => who === 'moderator' || who === 'administrator';
  it.each(endpointNames)('%s answers as the document says', async (name) => {
    const endpoint: Endpoint = endpoints[name];
    const answer = await calls.call(name, needsRole(endpoint) ? administrator : owner);
    const documented = operationOf(name).responses[String(endpoint.status)];
    expect(answer.status).toBe(endpoint.status);
    const [type, { schema }] = Object.entries(documented?.content ?? {})[0] ?? [undefined, {}];
    if (type === undefined) expect(answer.text).toBe('');
    else expect(answer.headers['content-type']).toContain(type);
    // Read with a schema made from the document, which refuses members it does not name.
    if (schema !== undefined) expect(z.fromJSONSchema(schema).safeParse(answer.body).error).toBeUndefined();
    if (endpoint.answer !== undefined) expect(endpoint.answer.parse(answer.body)).toEqual(answer.body);
  });

  it.each([
    ['a stranger', 401, () => club.stranger.call('get', '/api/machines'), 'listMachines'],
    ['a member among administrators', 403, () => owner.call('get', '/api/members'), 'listMembers'],
    ['a design that is not there', 404, () => owner.call('get', '/api/designs/none'), 'getDesign'],
    ['wrong fields', 422, () => owner.call('post', '/api/bits').send({}), 'addBit'],
    ['a body that is no JSON', 415, () => owner.call('post', '/api/bits').type('text').send('x'), 'addBit'],
    ['a wrong query', 400, () => owner.call('get', '/api/designs?sort=luck'), 'listDesigns'],
  ] as const)('tells of %s in the documented problem', async (_what, status, send, name) => {
    const answer = await send();
    expect(answer.status).toBe(status);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect(operationOf(name).responses).toHaveProperty(String(status));
    const problem = z.fromJSONSchema(served.components.schemas.Problem);
    expect(problem.safeParse(answer.body).error).toBeUndefined();
  });
});
