/** Prepares node_modules, then hands over to a command written in TypeScript: `node server/commands/run.mjs start`. */
import { spawn } from 'node:child_process';
import { resolve } from 'node:path';
import { ensureDependencies, requireNode20, root } from './dependencies.mjs';

requireNode20();
ensureDependencies();
const [name, ...rest] = process.argv.slice(2);
const child = spawn(
  process.execPath,
  ['--import', 'tsx', resolve(root, 'server/commands', `${name}.ts`), ...rest],
  { cwd: root, stdio: 'inherit' },
);
// Ctrl-C reaches the whole process group; this one waits for the command to stop what it started.
for (const signal of ['SIGINT', 'SIGTERM'])
  process.on(signal, () => signal === 'SIGTERM' && child.kill(signal));
child.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)));
