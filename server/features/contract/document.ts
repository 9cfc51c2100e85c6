/** The OpenAPI 3.1 description of the API, made from the schemas that the routes parse with. */
import { z } from 'zod';
import { problem } from '../../../shared/api/common';
import { operations, type Operation } from './operations';

type Json = Record<string, unknown>;

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Json => {
  const { $schema: _version, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
};
const json = (schema: Json, type = 'application/json'): Json => ({ [type]: { schema } });

const pathParameter = (name: string): Json => ({
  name,
  in: 'path',
  required: true,
  schema: { type: 'string' },
});

function queryParameters(query: z.ZodType | undefined): Json[] {
  if (!query) return [];
  const { properties } = z
    .object({ properties: z.record(z.string(), z.unknown()) })
    .parse(schemaOf(query, 'input'));
  return Object.entries(properties).map(([name, schema]) => ({ name, in: 'query', required: false, schema }));
}

function operationOf(path: string, { query, body, answer, status = 200 }: Operation): Json {
  const named = [...path.matchAll(/:(\w+)/g)].map(([, name = '']) => pathParameter(name));
  return {
    parameters: [...named, ...queryParameters(query)],
    ...(body ? { requestBody: { required: true, content: json(schemaOf(body, 'input')) } } : {}),
    responses: {
      [status]: { description: 'Done', ...(answer ? { content: json(schemaOf(answer, 'output')) } : {}) },
      default: {
        description: 'Refused, with the reason (RFC 9457)',
        content: json({ $ref: '#/components/schemas/Problem' }, 'application/problem+json'),
      },
    },
  };
}

export function openApiDocument(): Json {
  const paths: Record<string, Json> = {};
  for (const [name, operation] of Object.entries(operations)) {
    const [method = '', path = ''] = name.split(' ');
    const template = path.replace(/:(\w+)/g, '{$1}');
    paths[template] = { ...paths[template], [method]: operationOf(path, operation) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Coldloop', version: '1' },
    paths,
    components: { schemas: { Problem: schemaOf(problem, 'output') } },
  };
}
