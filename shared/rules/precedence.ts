/** A named cause hides the general rule that it explains, at the same point or in its group. */
import type { Finding } from './finding';
import type { RuleContext } from './context';

/** Of `input.undefined` only its sentence about the device that is off: that it is not on has another cause. */
const whileOff = ['input.never-off', 'finding.input.undefined.open'] as const;

/** By rule: the rules it hides, or one sentence of a rule. */
const hides: Record<string, readonly string[]> = {
  'output.triac-on-dc': ['supply.kind'],
  'output.transistor-on-ac': ['supply.kind'],
  'input.npn-on-sinking': ['input.never-on'],
  'input.pnp-on-sourcing': ['input.never-on'],
  'input.led-reversed': ['input.never-on'],
  'input.namur': ['input.never-on'],
  'input.dc-sensor-on-ac': ['input.never-on'],
  'input.ac-sensor-on-dc': ['input.never-on'],
  'input.leakage': whileOff,
  'input.cable-capacitance': whileOff,
  'output.ssr-control': ['output.load-underfed'],
};

/** At one group: the supply against the outputs is said once, by the output's own rule. */
const hidesInGroup: Record<string, readonly string[]> = {
  'output.voltage-window': ['supply.level-high', 'supply.level-low'],
};

/** A doubt for want of a datum explains nothing, so it hides nothing. */
const isCause = (finding: Finding) => finding.says.key !== 'finding.lacks';

/** The findings without those that a more exact finding explains. */
export function withoutExplained(findings: Finding[], context: RuleContext): Finding[] {
  const hidden = new Set<string>();
  for (const finding of findings) {
    const { point, group } = finding.where;
    if (!isCause(finding)) continue;
    if (group !== undefined && point === undefined)
      for (const rule of hidesInGroup[finding.rule] ?? []) hidden.add(`${rule} group ${group}`);
    if (point === undefined) continue;
    for (const rule of hides[finding.rule] ?? []) {
      hidden.add(`${rule} point ${point}`);
      for (const place of context.pointsByAddress.get(point) ?? [])
        if (place.group) hidden.add(`${rule} group ${place.group.group.tag}`);
    }
  }
  const isHidden = (name: string, { where }: Finding) =>
    hidden.has(`${name} point ${where.point}`) || hidden.has(`${name} group ${where.group}`);
  return findings.filter(
    (finding) => !isHidden(finding.rule, finding) && !isHidden(finding.says.key, finding),
  );
}
