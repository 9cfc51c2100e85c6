/**
 * `npm run -s panel -- check FILE [--scope ADDRESS,…] [--open ISOLATOR,…] [--json]`: what the engines say of a file.
 * Needs no database. Exit code 0: clean; 1: something hurts, or no safe isolation exists; 2: it could not be read.
 */
import { parseArgs } from 'node:util';
import { canHurt, checkPanel, unknownNames } from '../../shared/checklist/panelCheck';
import { panelCheckView } from '../features/panels/panelCheckMapper';
import { checkText } from './panel/checkText';
import { readPanelFile, Unreadable } from './panel/readPanelFile';

const usage = 'npm run -s panel -- check FILE [--scope ADDRESS,…] [--open ISOLATOR,…] [--json]';
// isolation.md §2: past 24 isolators the search may stop with the best set found, checked.
const longestSearchMs = 2000;
const refuse = (says: string): Unreadable => new Unreadable([{ path: 'arguments', says }]);

/** `A1,A2` as a list; absent stays absent, for it means something else than none. */
function listOf(name: string, value: string | undefined): string[] | undefined {
  if (value === undefined) return undefined;
  const items = value.split(',').map((item) => item.trim());
  if (items.includes('')) throw refuse(`--${name} holds an empty name`);
  return items;
}

function readArguments(args: string[]) {
  const options = { scope: { type: 'string' }, open: { type: 'string' }, json: { type: 'boolean' } } as const;
  try {
    const { values, positionals } = parseArgs({ args, options, allowPositionals: true });
    const [command, file, ...more] = positionals;
    if (command !== 'check' || file === undefined || more.length > 0) throw refuse(`use ${usage}`);
    return {
      file,
      json: values.json ?? false,
      scope: listOf('scope', values.scope),
      open: listOf('open', values.open),
    };
  } catch (error) {
    if (error instanceof Unreadable) throw error;
    throw refuse(`${error instanceof Error ? error.message : String(error)}; use ${usage}`);
  }
}

const complain = (reasons: Unreadable['reasons']): void => {
  for (const { path, says } of reasons) process.stderr.write(`${path}: ${says}\n`);
};

async function run(args: string[]): Promise<number> {
  const { file, json, scope, open } = readArguments(args);
  const panel = await readPanelFile(file);
  const unknown = unknownNames({ panel, scope, open });
  if (unknown.length > 0) throw new Unreadable(unknown);
  const until = Date.now() + longestSearchMs;
  const result = checkPanel({ panel, scope, open, mayGoOn: () => Date.now() < until });
  // A draft may hold these; who wants to issue it reads here what stands in the way.
  complain(result.problems);
  const view = panelCheckView(result, 'en');
  const own = panel.disconnect === null ? [] : [panel.disconnect];
  const asked = { language: 'en', points: result.scope.length, open: open ?? own } as const;
  process.stdout.write(json ? `${JSON.stringify(view, null, 2)}\n` : checkText(view, asked));
  return result.plan === null || canHurt(result.findings) ? 1 : 0;
}

try {
  process.exitCode = await run(process.argv.slice(2));
} catch (error) {
  if (!(error instanceof Unreadable)) throw error;
  complain(error.reasons);
  process.exitCode = 2;
}
