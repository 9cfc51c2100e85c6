/** Builds the services, listens, and stops without cutting anybody off. */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createApp } from './app';
import type { Config } from './config';
import { createServices, type Services } from './services';

export interface Serving {
  port: number;
  services: Services;
  close: () => Promise<void>;
}

/** @throws when the port is taken or the database does not answer. */
export async function serve(config: Config): Promise<Serving> {
  const services = await createServices(config);
  await services.start();
  const server = createServer(createApp(services));
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(config.port, config.host, resolve);
  });
  const { port } = server.address() as AddressInfo;
  services.log.info({ port }, 'serving');
  const closed = () =>
    new Promise<void>((resolve) => {
      server.close(() => resolve());
      server.closeIdleConnections();
    });
  return {
    port,
    services,
    close: async () => {
      await closed();
      await services.close();
    },
  };
}
