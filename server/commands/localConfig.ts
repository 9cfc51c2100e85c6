/** Settings of the local commands; what the environment sets wins. */
import { readConfig, type Config } from '../config';
import { freePort } from './cluster';
import { localPath, localSecret } from './localFolder';

const usualPort = 4310;

/** The usual port, or the next free one. */
export async function portToServe(wanted = Number(process.env.PORT ?? usualPort)): Promise<number> {
  for (let port = wanted; port < wanted + 50; port += 1)
    try {
      return await freePort(port);
    } catch {
      console.log(`Port ${port} is taken, trying ${port + 1} ...`);
    }
  throw new Error(`No free port from ${wanted} to ${wanted + 49}. Set PORT.`);
}

export async function localConfig(databaseUrl: string, smtpPort: number): Promise<Config> {
  const port = await portToServe();
  return readConfig({
    SESSION_SECRET: localSecret(),
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    DEV_MAIL_FOLDER: localPath('mail'),
    LOG_LEVEL: 'warn',
    BASE_URL: `http://localhost:${port}`,
    ...process.env,
    DATABASE_URL: databaseUrl,
    PORT: String(port),
  });
}
