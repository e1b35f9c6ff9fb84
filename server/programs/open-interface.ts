import { z } from 'zod';
import {
  createDocument,
  type ZodOpenApiOperationObject,
  type ZodOpenApiPathsObject,
} from 'zod-openapi';
import { programEvents } from '@/lib/contracts/programs';
import { env } from '@/server/base/env';
import { exampleList, type Operation, operations } from './interface-operations';

/** RFC 9457, as every refusal of ours is. */
const problem = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.number().int(),
    detail: z.string().optional(),
    errors: z.record(z.string(), z.string()).optional(),
  })
  .meta({ id: 'Problem' });

const told = z
  .object({
    type: z.enum(programEvents),
    timestamp: z.iso.datetime(),
    data: z.record(z.string(), z.union([z.string(), z.number()])),
  })
  .meta({ id: 'Told' });

/** The interface in the words of OpenAPI 3.1, made from the contracts that the routes themselves read by. */
export function openInterface() {
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Setwell',
      version: '1',
      description:
        'Ask with a key of your shop: "Authorization: Bearer setwell_…". Times are instants in UTC; days and times of day are local to the shop. A change that was made on an old version is refused with 409 and what stands now.',
    },
    servers: [{ url: env().publicUrl }],
    security: [{ key: [] }],
    paths: pathsOf(operations),
    webhooks: {
      told: {
        post: {
          summary:
            'What happened, signed as Standard Webhooks has it: webhook-id, webhook-timestamp, webhook-signature. Told at least once; the id is the same each time.',
          requestBody: { content: { 'application/json': { schema: told } } },
          responses: { 200: { description: 'Taken; anything else is told again for two days.' } },
        },
      },
    },
    components: {
      securitySchemes: { key: { type: 'http', scheme: 'bearer' } },
    },
  });
}

function pathsOf(all: Operation[]): ZodOpenApiPathsObject {
  const paths: ZodOpenApiPathsObject = {};
  for (const operation of all) {
    paths[operation.path] = { ...paths[operation.path], [operation.method]: described(operation) };
  }
  return paths;
}

function described(operation: Operation): ZodOpenApiOperationObject {
  const { id, summary, scope, method, input, inPath, answer, csv } = operation;
  const fields = Object.keys(input instanceof z.ZodObject ? input.shape : {});
  const elsewhere = fields.filter((name) => !inPath.includes(name));
  const isInQuery = method === 'get' || csv === 'sent';
  return {
    operationId: id,
    summary,
    description: `The key needs ${scope}.`,
    requestParams: {
      ...(inPath.length > 0 ? { path: picked(input, inPath) } : {}),
      ...(isInQuery && elsewhere.length > 0 ? { query: picked(input, elsewhere) } : {}),
    },
    ...(method === 'get' ? {} : { requestBody: bodyOf(operation, elsewhere) }),
    responses: {
      200: {
        description: 'Done.',
        content: { [csv === 'given' ? 'text/csv' : 'application/json']: { schema: answer } },
      },
      '4XX': {
        description: 'Refused: nothing was changed.',
        content: { 'application/problem+json': { schema: problem } },
      },
    },
  };
}

function bodyOf({ input, inPath, csv, example }: Operation, elsewhere: string[]) {
  const schema = inPath.length > 0 ? picked(input, elsewhere) : input;
  return {
    required: true,
    content: {
      ...(csv === 'sent'
        ? { 'text/csv': { schema: z.string(), example: exampleList } }
        : { 'application/json': { schema, example: without(example, inPath) } }),
    },
  };
}

function picked(input: z.ZodType, names: string[]): z.ZodObject {
  if (!(input instanceof z.ZodObject)) throw new Error('only fields of an object can be picked');
  return z.object(
    Object.fromEntries(Object.entries(input.shape).filter(([name]) => names.includes(name))),
  );
}

function without(example: Record<string, unknown>, names: string[]): Record<string, unknown> {
  return Object.fromEntries(Object.entries(example).filter(([name]) => !names.includes(name)));
}
