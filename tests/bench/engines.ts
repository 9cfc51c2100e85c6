/** Times checks, lock plan and checklist of a generated panel: `npx tsx tests/bench/engines.ts [points]`. Nothing is asserted. */
import type { ChecklistInput } from '../../shared/checklist/facts';
import { generateChecklist } from '../../shared/checklist/generate';
import { checkPanel } from '../../shared/checklist/panelCheck';
import { deadTests } from '../../shared/isolation/deadTests';
import { isolationFindings } from '../../shared/isolation/isolationFindings';
import { lockPlan } from '../../shared/isolation/lockPlan';
import { stillLive } from '../../shared/isolation/stillLive';
import { waits } from '../../shared/isolation/waits';
import { digestOf } from '../../shared/panel/canonical';
import { checkWiring } from '../../shared/rules/checkWiring';
import { generatedPanel } from './generatedPanel';

// What the three together should take for 2,000 points in Node.
const aimMs = 150;
const runs = 9;

const points = Number(process.argv[2] ?? 2000);
const panel = generatedPanel(points);
const scope = panel.points.map(({ address }) => address);
const plan = lockPlan(panel, scope);
if (!plan) throw new Error('the generated panel has no safe isolation');

const input: ChecklistInput = {
  panel,
  panelDigest: digestOf(panel),
  ruleSet: 'bench',
  scope,
  findings: isolationFindings(panel, scope, { plan }),
  plan,
  stillLive: stillLive(panel, new Set(['Q1'])),
  deadTests: deadTests(panel, scope, plan),
  waits: waits(panel, scope),
  settings: { deadLimitV: 1, permitAsked: true, ferruleScheme: 'DIN 46228-4' },
};

interface Timed {
  name: string;
  firstMs: number;
  medianMs: number;
  /** Least processor time of a run: what remains when other work shares the machine. */
  cpuMs: number;
}

function timed(name: string, run: () => unknown): Timed {
  const seen = Array.from({ length: runs }, () => {
    const start = performance.now();
    const before = process.cpuUsage();
    run();
    const { user, system } = process.cpuUsage(before);
    return { ms: performance.now() - start, cpuMs: (user + system) / 1000 };
  });
  const sorted = seen.map(({ ms }) => ms).sort((a, b) => a - b);
  return {
    name,
    firstMs: seen[0]?.ms ?? 0,
    medianMs: sorted[Math.floor(runs / 2)] ?? 0,
    cpuMs: Math.min(...seen.map(({ cpuMs }) => cpuMs)),
  };
}

const parts = [
  timed('checks: wiring', () => checkWiring(panel)),
  timed('checks: isolation', () => isolationFindings(panel, scope, { plan })),
  timed('lock plan', () => lockPlan(panel, scope)),
  timed('checklist', () => generateChecklist(input)),
];
const beside = [
  timed('still-live picture', () => stillLive(panel, new Set(['Q1']))),
  timed('dead tests', () => deadTests(panel, scope, plan)),
  timed('digest', () => digestOf(panel)),
  timed('everything of a panel check', () => checkPanel({ panel })),
];

const row = ({ name, firstMs, medianMs, cpuMs }: Timed): string =>
  [
    name.padEnd(28),
    `${medianMs.toFixed(1).padStart(8)} ms`,
    `${(medianMs / aimMs).toFixed(2).padStart(6)} of the aim`,
    `  (first run ${firstMs.toFixed(1)} ms; least processor time ${cpuMs.toFixed(1)} ms)`,
  ].join(' ');

const total = (key: 'firstMs' | 'medianMs' | 'cpuMs'): number =>
  parts.reduce((sum, part) => sum + part[key], 0);
const sum: Timed = {
  name: 'checks + plan + checklist',
  firstMs: total('firstMs'),
  medianMs: total('medianMs'),
  cpuMs: total('cpuMs'),
};
const { steps } = generateChecklist(input);
console.log(
  [
    `${scope.length} points, ${panel.supplies.length} supplies, ${panel.isolators.length} isolators, ${input.deadTests.length} pairs, ${steps.length} steps; median of ${runs} runs, aim ${aimMs} ms`,
    ...parts.map(row),
    row(sum),
    'beside these:',
    ...beside.map(row),
  ].join('\n'),
);
