/** Debian packages that a command needs: found, installed when root, or named. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

export interface Needed {
  name: string;
  present: () => boolean;
}

const onPath = (program: string): boolean =>
  (process.env.PATH ?? '').split(':').some((folder) => existsSync(join(folder, program)));

/** Folder of the newest installed PostgreSQL's programs, or null. */
export function postgresPrograms(): string | null {
  const base = '/usr/lib/postgresql';
  if (!existsSync(base)) return null;
  const versions = readdirSync(base).sort((a, b) => Number(b) - Number(a));
  const found = versions
    .map((version) => join(base, version, 'bin'))
    .find((bin) => existsSync(join(bin, 'initdb')));
  return found ?? null;
}

export const packages = {
  postgresql: { name: 'postgresql', present: () => postgresPrograms() !== null },
  chromium: { name: 'chromium', present: () => existsSync('/usr/bin/chromium') },
  ngspice: { name: 'ngspice', present: () => onPath('ngspice') },
  poppler: { name: 'poppler-utils', present: () => onPath('pdftotext') },
} satisfies Record<string, Needed>;

/** Debian would otherwise start a cluster of its own on the usual port. */
function keepDebianFromStartingOne(): void {
  const folder = '/etc/postgresql-common/createcluster.d';
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, 'coldloop.conf'), 'create_main_cluster = false\n');
}

function apt(args: string[]): void {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const done = spawnSync('apt-get', ['-q', '-y', ...args], { stdio: ['ignore', 'ignore', 'inherit'], env });
  if (done.status !== 0) throw new Error(`apt-get ${args.join(' ')} failed`);
}

/** @throws Error naming the packages when they are missing and cannot be installed here. */
export function ensurePackages(needed: readonly Needed[]): void {
  const missing = needed.filter((each) => !each.present()).map((each) => each.name);
  if (missing.length === 0) return;
  if (process.getuid?.() !== 0 || !onPath('apt-get'))
    throw new Error(
      `These Debian packages are missing: ${missing.join(' ')}\nInstall them as root: apt-get install ${missing.join(' ')}`,
    );
  console.log(`Installing from Debian: ${missing.join(' ')} ...`);
  keepDebianFromStartingOne();
  apt(['update']);
  apt(['install', '--no-install-recommends', ...missing]);
}
