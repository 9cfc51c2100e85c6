/** Runs ngspice, a general-purpose circuit simulator, on a netlist and reads the numbers it prints. */
import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** @returns what the control section printed or measured, by lower-case name. @throws Error when ngspice is missing or fails. */
export function ngspice(elements: readonly string[], control: readonly string[]): Map<string, number> {
  const folder = mkdtempSync(join(tmpdir(), 'loops-'));
  try {
    const file = join(folder, 'loops.cir');
    writeFileSync(
      file,
      ['* loops', ...elements, '.control', 'set noaskquit', ...control, 'quit', '.endc', '.end', ''].join(
        '\n',
      ),
    );
    const said = execFileSync('ngspice', ['-b', file], {
      encoding: 'utf8',
      maxBuffer: 64e6,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    return new Map(
      [...said.matchAll(/^([\w#().]+)\s+=\s+(-?[\d.]+e[+-]\d+)/gim)].map(([, name = '', value]) => [
        name.toLowerCase(),
        Number(value),
      ]),
    );
  } finally {
    rmSync(folder, { recursive: true });
  }
}
