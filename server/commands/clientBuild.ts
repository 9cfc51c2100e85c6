/** Builds the client when what it is made of has changed since the last build. */
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { clientFolder } from '../http/client';
import { projectFolder } from './localFolder';

const madeOf = [
  'src',
  'shared',
  'public',
  'index.html',
  'vite.config.ts',
  'tsconfig.json',
  'package-lock.json',
];
const stampFile = join(clientFolder, '../client.stamp');

function filesOf(path: string): string[] {
  if (!existsSync(path)) return [];
  if (statSync(path).isFile()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesOf(join(path, name)));
}

function stampNow(): string {
  const hash = createHash('sha256');
  for (const file of madeOf.flatMap((name) => filesOf(join(projectFolder, name))))
    hash.update(file.slice(projectFolder.length)).update(readFileSync(file));
  return hash.digest('hex');
}

/** @throws Error with the bundler's words when it fails. */
export function buildClient(): void {
  const stamp = stampNow();
  const isBuilt = existsSync(join(clientFolder, 'index.html')) && existsSync(stampFile);
  if (isBuilt && readFileSync(stampFile, 'utf8') === stamp) return;
  console.log('Building the client ...');
  const vite = join(projectFolder, 'node_modules/vite/bin/vite.js');
  const done = spawnSync(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: projectFolder,
    encoding: 'utf8',
    // A test run says otherwise, and would get a slow app without its worker.
    env: { ...process.env, NODE_ENV: 'production' },
  });
  if (done.status !== 0) throw new Error(`The client could not be built:\n${done.stdout}${done.stderr}`);
  writeFileSync(stampFile, stamp);
}
