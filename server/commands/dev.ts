/** `npm run dev`: the server restarted and the client reloaded as files change. */
import { spawn, type ChildProcess } from 'node:child_process';
import { startMailFake } from '../features/mail/devMail';
import { createServices } from '../services';
import { untilStopped } from '../untilStopped';
import { seedOnce } from './demo/seedOnce';
import { printSignIns } from './demo/signIns';
import { localConfig, portToServe } from './localConfig';
import { migrateLocal, openLocalDatabase } from './localDatabase';
import { claimStart, localPath, projectFolder } from './localFolder';

const run = (args: string[], env: Record<string, string>): ChildProcess =>
  spawn(process.execPath, args, { cwd: projectFolder, stdio: 'inherit', env: { ...process.env, ...env } });

const letGo = claimStart();
const stopped = untilStopped();
const database = await openLocalDatabase();
const mail = await startMailFake(localPath('mail'));
try {
  await migrateLocal(database.url);
  const config = await localConfig(database.url, mail.port);
  const services = await createServices(config);
  await seedOnce(services);
  await services.close();
  const clientPort = await portToServe(config.port + 1);
  const server = run(['--watch', '--import', 'tsx', 'server/index.ts'], {
    DATABASE_URL: config.databaseUrl,
    PORT: String(config.port),
    BASE_URL: `http://localhost:${clientPort}`,
    SESSION_SECRET: config.sessionSecret,
    SMTP_URL: config.smtpUrl,
    DEV_MAIL_FOLDER: localPath('mail'),
    LOG_LEVEL: 'info',
  });
  const client = run(['node_modules/vite/bin/vite.js', '--port', String(clientPort), '--strictPort'], {
    COLDLOOP_API: `http://127.0.0.1:${config.port}`,
  });
  console.log(`\nColdloop, reloading: http://localhost:${clientPort}`);
  printSignIns();
  await stopped;
  server.kill('SIGTERM');
  client.kill('SIGTERM');
} finally {
  await mail.close();
  database.stop();
  letGo();
}
process.exit(0);
