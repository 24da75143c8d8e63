import { z } from 'zod';
import { contracts } from '../../shared/api';
import { type Contract } from '../../shared/api/contract';
import { problemSchema } from '../../shared/api/problem';

type Json = Record<string, unknown>;

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Json =>
  z.toJSONSchema(schema, {
    target: 'draft-2020-12',
    io,
    unrepresentable: 'any',
    reused: 'inline',
  });

function parameters(contract: Contract): Json[] {
  const list = (schema: z.ZodType | undefined, where: 'path' | 'query'): Json[] => {
    if (!schema) return [];
    const json = schemaOf(schema, 'input');
    const required = new Set((json.required as string[] | undefined) ?? []);
    return Object.entries((json.properties as Json | undefined) ?? {}).map(([name, property]) => ({
      name,
      in: where,
      required: where === 'path' || required.has(name),
      schema: property,
    }));
  };
  return [...list(contract.params, 'path'), ...list(contract.query, 'query')];
}

function requestBody(contract: Contract): Json | undefined {
  if (contract.upload) {
    const file = {
      type: 'object',
      properties: { [contract.upload.field]: { type: 'string', format: 'binary' } },
    };
    return { required: true, content: { 'multipart/form-data': { schema: file } } };
  }
  return contract.body
    ? {
        required: true,
        content: { 'application/json': { schema: schemaOf(contract.body, 'input') } },
      }
    : undefined;
}

function operation(contract: Contract): Json {
  const body = requestBody(contract);
  const success: Json = { description: contract.summary };
  if (contract.response && contract.status !== 204) {
    success.content = { 'application/json': { schema: schemaOf(contract.response, 'output') } };
  }
  return {
    operationId: contract.id,
    summary: contract.summary,
    'x-access': contract.access,
    parameters: parameters(contract),
    ...(body ? { requestBody: body } : {}),
    responses: {
      [String(contract.status ?? 200)]: success,
      default: {
        description: 'A problem',
        content: {
          'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } },
        },
      },
    },
  };
}

let made: Json | undefined;

/** The OpenAPI 3.1 document of all contracts; made once. */
export function openApi(): Json {
  if (made) return made;
  const paths: Record<string, Json> = {};
  for (const contract of contracts) {
    const path = `/api${contract.path.replace(/:(\w+)/g, '{$1}')}`;
    paths[path] = { ...paths[path], [contract.method.toLowerCase()]: operation(contract) };
  }
  made = {
    openapi: '3.1.0',
    info: {
      title: 'Scantling',
      version: '0.1.0',
      description: 'Changing requests carry the header X-Scantling: 1.',
    },
    paths,
    components: { schemas: { Problem: schemaOf(problemSchema, 'output') } },
  };
  return made;
}
