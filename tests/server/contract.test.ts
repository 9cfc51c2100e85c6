import request from 'supertest';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { operations } from '../../server/features/contract/operations';
import { routesOf } from '../support/routes';
import { testServices, type TestServer } from '../support/testServices';

let server: TestServer;
beforeAll(async () => {
  server = await testServices();
});
afterAll(() => server.close());

it('describes every route that the router has, and no other', () => {
  const routes = routesOf(server.app).filter(({ path }) => path.startsWith('/api/'));
  expect(Object.keys(operations).sort()).toEqual(
    routes.map(({ method, path }) => `${method} ${path}`).sort(),
  );
});

it('is served as OpenAPI 3.1 with the schemas of bodies and answers', async () => {
  const { body } = await request(server.app).get('/api/openapi.json').expect(200);
  expect(body.openapi).toBe('3.1.0');
  const push = body.paths['/api/jobs/{id}/entries'].post;
  expect(push.requestBody.content['application/json'].schema.properties.entries).toMatchObject({
    maxItems: 500,
  });
  expect(push.parameters).toEqual([{ name: 'id', in: 'path', required: true, schema: { type: 'string' } }]);
  expect(body.paths['/api/jobs'].get.parameters.map((each: { name: string }) => each.name)).toContain(
    'waiting',
  );
  expect(JSON.stringify(body)).not.toContain('"$ref":"#/$defs');
});

it('publishes the panel file’s JSON Schema to anybody', async () => {
  const { body } = await request(server.app).get('/api/schema/panel.json').expect(200);
  expect(body.properties.format).toMatchObject({ const: 'coldloop-panel/1' });
  expect(body.additionalProperties).toBe(false);
});
