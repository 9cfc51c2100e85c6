/** The git-ignored folder where the commands keep what belongs to this machine: cluster, mails, secret. */
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';

export const projectFolder = resolve(import.meta.dirname, '../..');
export const localFolder = join(projectFolder, '.local');
export const localPath = (...names: string[]): string => join(localFolder, ...names);

/** Kept over starts, so that sessions survive a restart. */
export function localSecret(): string {
  mkdirSync(localFolder, { recursive: true });
  const file = localPath('session-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 });
  return readFileSync(file, 'utf8');
}

const pidFile = () => localPath('start.pid');

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

/** One start per checkout: a second one would stop the database under the first. Answers how to let go. */
export function claimStart(): () => void {
  mkdirSync(localFolder, { recursive: true });
  const other = existsSync(pidFile()) ? Number(readFileSync(pidFile(), 'utf8')) : 0;
  if (other > 0 && other !== process.pid && isAlive(other))
    throw new Error(`Coldloop already runs from this folder (process ${other}). Stop it first with Ctrl-C.`);
  writeFileSync(pidFile(), String(process.pid));
  return () => rmSync(pidFile(), { force: true });
}
