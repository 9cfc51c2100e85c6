/** Listens, and stops without cutting anybody off. */
import { createServer } from 'node:http';
import { createApp } from './app';
import { readConfig } from './config';
import { createServices } from './services';

const config = readConfig();
const services = await createServices(config);
await services.start();
const server = createServer(createApp(services));
server.listen(config.port, config.host, () => {
  services.log.info({ port: config.port }, 'serving');
  process.send?.('ready');
});

let stopping = false;
function stop(): void {
  if (stopping) return;
  stopping = true;
  server.close(() => {
    void services.close().then(() => process.exit(0));
  });
  server.closeIdleConnections();
}
process.on('SIGTERM', stop);
process.on('SIGINT', stop);
