import { z } from 'zod';

import { ALL_CONTRACTS, type NamedContract } from '@/shared/contracts/all-contracts';
import { API_ROOT, type Contract } from '@/shared/contracts/contract';
import { EVENTS_PATH, shopEventSchema } from '@/shared/contracts/events';
import { BUNDLE_PATH, bundleParams, SHEET_PATH, sheetParams, sheetQuery } from '@/shared/contracts/sheets';
import { PROBLEMS, problemSchema, type ProblemCode } from '@/shared/problems/problem';
import { may, ROLES } from '@/shared/roles/roles';

type Json = Record<string, unknown>;

/** What any request can meet, beside what its contract names. */
const ALWAYS: readonly ProblemCode[] = ['validation_failed', 'too_many_requests', 'internal_error'];
const SIGNED_IN: readonly ProblemCode[] = ['not_signed_in', 'session_ended', 'not_allowed'];

/** The API document. @see OpenAPI Specification 3.1 */
export function openApiDocument(): Json {
  const paths: Record<string, Json> = {};
  const add = (path: string, method: string, operation: Json): void => {
    const key = path.replaceAll(/:(\w+)/g, '{$1}');
    paths[key] = { ...paths[key], [method]: operation };
  };
  for (const named of ALL_CONTRACTS) add(named.contract.path, named.contract.method, operationOf(named));
  add(EVENTS_PATH, 'get', eventsOperation());
  add(SHEET_PATH, 'get', sheetOperation());
  add(BUNDLE_PATH, 'get', bundleOperation());
  return {
    openapi: '3.1.0',
    info: { title: 'Offsquare', version: '1', description: 'Lengths inches, angles degrees, money integer cents.' },
    servers: [{ url: API_ROOT }],
    paths,
    components: {
      schemas: { Problem: jsonSchema(problemSchema, 'output') },
      securitySchemes: {
        accessToken: { type: 'http', scheme: 'bearer', bearerFormat: 'JWT' },
        refreshCookie: { type: 'apiKey', in: 'cookie', name: 'offsquare_session' },
      },
    },
  };
}

function operationOf({ name, resource, contract }: NamedContract): Json {
  const parameters = [
    ...parametersOf(contract.params, 'path'),
    ...parametersOf(contract.query, 'query'),
    ...(contract.creates ? [IDEMPOTENCY_KEY] : []),
  ];
  return {
    operationId: name,
    tags: [resource],
    summary: contract.summary,
    description: whoMay(contract),
    ...(contract.may === 'public' ? {} : { security: [{ accessToken: [] }] }),
    ...(parameters.length > 0 ? { parameters } : {}),
    ...(contract.body
      ? {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: jsonSchema(contract.body, 'input') } },
          },
        }
      : {}),
    responses: { ...goodAnswer(contract), ...problemAnswers(contract) },
  };
}

const IDEMPOTENCY_KEY: Json = {
  name: 'Idempotency-Key',
  in: 'header',
  required: true,
  description: 'The same key for the same request, sent again; 8 to 200 characters.',
  schema: { type: 'string', minLength: 8, maxLength: 200 },
};

function whoMay({ may: permission }: Contract): string {
  if (permission === 'public') return 'Without sign-in.';
  if (permission === 'member') return 'Anybody of the shop.';
  return `Roles: ${ROLES.filter((role) => may(role, permission)).join(', ')}.`;
}

function parametersOf(schema: z.ZodObject | undefined, place: 'path' | 'query'): Json[] {
  if (!schema) return [];
  return Object.entries(schema.shape).map(([name, field]) => ({
    name,
    in: place,
    required: place === 'path' || !(field as z.ZodType).safeParse(undefined).success,
    schema: jsonSchema(field as z.ZodType, 'input'),
  }));
}

function goodAnswer({ response, creates, method, path }: Contract): Json {
  if (response === null) return { 204: { description: 'Done.' } };
  const status = creates || (method === 'post' && path === '/auth/join') ? 201 : 200;
  const schema = jsonSchema(response, 'output');
  return { [status]: { description: 'Done.', content: { 'application/json': { schema } } } };
}

function problemAnswers(contract: Contract): Json {
  const codes = new Set<ProblemCode>([
    ...contract.problems,
    ...ALWAYS,
    ...(contract.may === 'public' ? [] : SIGNED_IN),
    ...(contract.creates ? (['idempotency_key_required', 'idempotency_key_reused'] as const) : []),
    ...(contract.body ? (['malformed_json', 'media_type_refused', 'body_too_large'] as const) : []),
  ]);
  return Object.fromEntries([...groupByStatus(codes)].map(([status, list]) => [status, problemAnswer(list)]));
}

function groupByStatus(codes: ReadonlySet<ProblemCode>): Map<number, ProblemCode[]> {
  const groups = new Map<number, ProblemCode[]>();
  for (const code of codes) groups.set(PROBLEMS[code].status, [...(groups.get(PROBLEMS[code].status) ?? []), code]);
  return groups;
}

function problemAnswer(codes: readonly ProblemCode[]): Json {
  return {
    description: codes.map((code) => `${code}: ${PROBLEMS[code].title}.`).join(' '),
    content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
  };
}

function eventsOperation(): Json {
  return {
    operationId: 'listen',
    tags: ['events'],
    summary: 'Changes of the shop as server-sent events named change; the stream ends with the access token.',
    description: 'Anybody of the shop.',
    security: [{ accessToken: [] }],
    responses: {
      200: {
        description: 'A stream; the data of each event follows this schema.',
        content: { 'text/event-stream': { schema: jsonSchema(shopEventSchema, 'output') } },
      },
      401: problemAnswer(['not_signed_in']),
    },
  };
}

function sheetOperation(): Json {
  return {
    operationId: 'printSheets',
    tags: ['sheets'],
    summary: 'Sheets of one kind as a PDF, or all of them as one set.',
    description: whoMay({ may: 'sheet.print' } as Contract),
    security: [{ accessToken: [] }],
    parameters: [...parametersOf(sheetParams, 'path'), ...parametersOf(sheetQuery, 'query')],
    responses: {
      200: { description: 'The sheet.', content: { 'application/pdf': {} } },
      401: problemAnswer(['not_signed_in']),
      404: problemAnswer(['not_found']),
      409: problemAnswer(['plan_refused']),
      422: problemAnswer(['validation_failed']),
      503: problemAnswer(['busy']),
    },
  };
}

function bundleOperation(): Json {
  return {
    ...sheetOperation(),
    operationId: 'bundleSheets',
    summary: 'Every sheet, drawing and list, and the job file, as one archive.',
    parameters: [...parametersOf(bundleParams, 'path'), ...parametersOf(sheetQuery, 'query')],
    responses: {
      ...(sheetOperation().responses as Json),
      200: { description: 'The archive.', content: { 'application/zip': {} } },
    },
  };
}

function jsonSchema(schema: z.ZodType, io: 'input' | 'output'): unknown {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' }) as Json;
  return rest;
}
