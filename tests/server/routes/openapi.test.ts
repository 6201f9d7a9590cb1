import { ALL_CONTRACTS } from '@/shared/contracts/all-contracts';
import { PROBLEMS } from '@/shared/problems/problem';
import { openTestServer, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let document: {
  openapi: string;
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, unknown> };
};

interface Operation {
  readonly operationId: string;
  readonly summary: string;
  readonly security?: unknown[];
  readonly parameters?: { name: string; in: string; required: boolean }[];
  readonly requestBody?: { content: { 'application/json': { schema: { properties?: Record<string, unknown> } } } };
  readonly responses: Record<string, { description: string }>;
}

beforeAll(async () => {
  server = await openTestServer();
  document = (await server.nobody.get('/openapi.json').expect(200)).body as typeof document;
});

afterAll(() => server.close());

describe('GET /openapi.json', () => {
  it('describes every contract, the events and the sheets', () => {
    const operations = Object.values(document.paths).flatMap((path) => Object.values(path));
    const ids = operations.map(({ operationId }) => operationId).sort();

    expect(document.openapi).toBe('3.1.0');
    expect(ids).toEqual([...ALL_CONTRACTS.map(({ name }) => name), 'listen', 'printSheets', 'bundleSheets'].sort());
  });

  it('names every parameter of every path, and no other', () => {
    for (const [path, methods] of Object.entries(document.paths)) {
      const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
      for (const operation of Object.values(methods)) {
        const named = (operation.parameters ?? []).filter((parameter) => parameter.in === 'path');
        expect([path, named.map(({ name }) => name)]).toEqual([path, inPath]);
        expect(named.every(({ required }) => required)).toBe(true);
      }
    }
  });

  it('asks for an Idempotency-Key where something is made, and a sign-in where one is needed', () => {
    for (const { name, contract } of ALL_CONTRACTS) {
      const key = contract.path.replaceAll(/:(\w+)/g, '{$1}');
      const operation = document.paths[key]?.[contract.method];
      const asks = operation?.parameters?.some((parameter) => parameter.name === 'Idempotency-Key') ?? false;
      expect([name, asks]).toEqual([name, contract.creates === true]);
      expect([name, operation?.security !== undefined]).toEqual([name, contract.may !== 'public']);
    }
  });

  it('lists the problems of each operation under their status', () => {
    const edits = document.paths['/layouts/{layoutId}/edits']?.['post'];

    expect(Object.keys(edits?.responses ?? {})).toEqual([
      '200',
      '400',
      '401',
      '403',
      '404',
      '409',
      '413',
      '415',
      '422',
      '429',
      '500',
    ]);
    expect(edits?.responses['409']?.description).toBe(`edits_refused: ${PROBLEMS.edits_refused.title}.`);
  });

  it('carries the schema of a body with the fields of the contract', () => {
    const body = document.paths['/jobs']?.['post']?.requestBody?.content['application/json'].schema;

    expect(Object.keys(body?.properties ?? {})).toEqual(['name', 'customerName', 'siteAddress']);
    expect(document.components.schemas['Problem']).toMatchObject({ type: 'object' });
  });
});
