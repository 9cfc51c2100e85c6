/** The built client on a port of its own, with the fake server of entries behind /api and a version that can change. */
import { readFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import express, { type RequestHandler } from 'express';
import { clientFolder, clientShell, staticClient } from '../../../server/http/client';
import { securityHeaders } from '../../../server/http/securityHeaders';
import type { SessionView } from '../../../shared/api/people';
import { FakeServer } from './fakeServer';

export interface ServedBuild {
  url: string;
  fake: FakeServer;
  /** From now on the worker's file is another one, as after a new build. */
  releaseNewVersion: () => void;
  close: () => Promise<void>;
}

const handOver =
  (fake: FakeServer): RequestHandler =>
  async (request, response) => {
    const body = request.body as unknown;
    const init = request.method === 'GET' ? {} : { body: JSON.stringify(body) };
    const answer = await fake.fetch(request.originalUrl, { method: request.method, ...init });
    response.status(answer.status).type(answer.headers.get('content-type') ?? 'json');
    response.send(await answer.text());
  };

export async function servedBuild(session: SessionView): Promise<ServedBuild> {
  const fake = new FakeServer();
  fake.session = session.person.id;
  let release = 1;
  const app = express();
  app.use(securityHeaders);
  app.get('/api/session', (_request, response) => {
    response.json(session);
  });
  app.use('/api', express.json({ limit: '2mb' }), handOver(fake));
  app.get('/sw.js', (_request, response) => {
    const worker = readFileSync(join(clientFolder, 'sw.js'), 'utf8');
    response
      .type('text/javascript')
      .set('cache-control', 'no-cache')
      .send(`${worker}\n// release ${release}`);
  });
  app.use(staticClient());
  app.use(clientShell);
  const server = app.listen(0, '127.0.0.1');
  await new Promise((resolve) => server.once('listening', resolve));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://localhost:${port}`,
    fake,
    releaseNewVersion: () => {
      release += 1;
    },
    close: () =>
      new Promise((resolve) => {
        server.close(() => {
          resolve();
        });
        server.closeAllConnections();
      }),
  };
}
