/** The steps of a terminal, point or isolator that a person names, for *Jump to terminal*. */
import type { Pack } from '../../../../shared/api/jobs';
import type { Step } from '../../../../shared/checklist/types';
import type { Where } from '../../../../shared/rules/finding';
import type { Panel } from '../../../../shared/panel/panelSchema';

const bare = (name: string): string => name.replace(/\s/g, '').toUpperCase();

const placeNames = (where: Where = {}): string[] => Object.values({ ...where });

/** Every name under which a step's place may be typed: its tags, and its point's address, terminals and wires. */
function namesOf(step: Step, panel: Panel): string[] {
  const point = panel.points.find(({ address }) => address === step.where?.point);
  const dead = step.ask.kind === 'reading' ? step.ask.dead : undefined;
  return [
    ...placeNames(step.where),
    ...(point ? [point.terminal, point.wire, point.device.tag ?? ''] : []),
    ...(point?.conductors ?? []).flatMap(({ terminal, wire }) => [terminal, wire]),
    ...(dead ? [dead.terminal, dead.second] : []),
  ].map(bare);
}

/** Exact names first; else those that contain what was typed. Empty while nothing is typed. */
export function stepsAt(pack: Pack, typed: string): Step[] {
  const wanted = bare(typed);
  if (!wanted) return [];
  const named = pack.checklist.steps.map((step) => ({ step, names: namesOf(step, pack.panel) }));
  const exact = named.filter(({ names }) => names.includes(wanted));
  const found =
    exact.length > 0 ? exact : named.filter(({ names }) => names.some((name) => name.includes(wanted)));
  return found.map(({ step }) => step);
}
