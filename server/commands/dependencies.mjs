/** Installs node_modules when it does not match the lock. Needs nothing but Node itself. */
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';

export const root = resolve(import.meta.dirname, '../..');
const stampFile = resolve(root, 'node_modules/.coldloop-lock');

export function requireNode20() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  console.error(`Coldloop needs Node 20.19 or newer; this is ${process.versions.node}.`);
  process.exit(1);
}

export function ensureDependencies() {
  const lock = createHash('sha256')
    .update(readFileSync(resolve(root, 'package-lock.json')))
    .digest('hex');
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === lock) return;
  // On standard error: a command's own answer may be read by a program.
  console.error('Installing dependencies ...');
  const npm = process.env.npm_execpath;
  const [command, args] = npm ? [process.execPath, [npm, 'ci']] : ['npm', ['ci']];
  const done = spawnSync(command, args, { cwd: root, stdio: ['inherit', 2, 'inherit'] });
  if (done.status !== 0) {
    console.error('The dependencies could not be installed. Nothing else was started.');
    process.exit(done.status ?? 1);
  }
  writeFileSync(stampFile, lock);
}
