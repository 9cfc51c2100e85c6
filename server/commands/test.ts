/** `npm test`: what the tests need, then lint, types and every test; the last line is `N passed, N failed`. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { buildClient } from './clientBuild';
import { ensurePackages, packages } from './debian';
import { localPath, projectFolder } from './localFolder';

interface Tally {
  passed: number;
  failed: number;
}

const tool = (path: string) => join(projectFolder, 'node_modules', path);

function runNode(args: string[]): boolean {
  const done = spawnSync(process.execPath, args, { cwd: projectFolder, stdio: 'inherit' });
  return done.status === 0;
}

/** Each counts as one test of its own. */
const checks: { name: string; run: () => boolean }[] = [
  { name: 'lint', run: () => runNode([tool('eslint/bin/eslint.js'), '.', '--max-warnings', '0']) },
  {
    name: 'format',
    run: () => runNode([tool('prettier/bin/prettier.cjs'), '--check', '--log-level', 'warn', '.']),
  },
  { name: 'types', run: () => runNode([tool('typescript/bin/tsc'), '--noEmit']) },
  {
    name: 'types of the service worker',
    run: () => runNode([tool('typescript/bin/tsc'), '--noEmit', '-p', 'src/offline/serviceWorker']),
  },
];

function runCheck({ name, run }: (typeof checks)[number]): boolean {
  console.log(`\n${name} ...`);
  const passed = run();
  console.log(`${name}: ${passed ? 'passed' : 'FAILED'}`);
  return passed;
}

const results = z.object({
  numPassedTests: z.int(),
  numFailedTests: z.int(),
  numPendingTests: z.int(),
  numTodoTests: z.int(),
  success: z.boolean(),
});

/** A test that did not run counts as failed: nothing is skipped here. */
function runTests(filters: string[]): Tally {
  const file = localPath('test-results.json');
  mkdirSync(localPath(), { recursive: true });
  rmSync(file, { force: true });
  const isRun = runNode([
    tool('vitest/vitest.mjs'),
    'run',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${file}`,
    ...filters,
  ]);
  if (!existsSync(file)) return { passed: 0, failed: 1 };
  const found = results.parse(JSON.parse(readFileSync(file, 'utf8')));
  const failed = found.numFailedTests + found.numPendingTests + found.numTodoTests;
  const isWhole = isRun && found.success && found.numPassedTests > 0;
  return { passed: found.numPassedTests, failed: failed > 0 || isWhole ? failed : 1 };
}

function main(filters: string[]): number {
  ensurePackages([packages.postgresql, packages.chromium, packages.ngspice, packages.poppler]);
  const checked = filters.length > 0 ? [] : checks.map(runCheck);
  buildClient();
  console.log('\ntests ...');
  const tests = runTests(filters);
  const passed = tests.passed + checked.filter(Boolean).length;
  const failed = tests.failed + checked.filter((each) => !each).length;
  console.log(`\n${passed} passed, ${failed} failed`);
  return failed === 0 ? 0 : 1;
}

try {
  process.exitCode = main(process.argv.slice(2));
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
