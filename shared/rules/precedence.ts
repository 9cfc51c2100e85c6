/** A named cause hides the general rule that it explains, at the same point or in its group. */
import type { Finding } from './finding';
import type { RuleContext } from './context';

const hides: Record<string, readonly string[]> = {
  'output.triac-on-dc': ['supply.kind'],
  'output.transistor-on-ac': ['supply.kind'],
  'input.npn-on-sinking': ['input.never-on'],
  'input.pnp-on-sourcing': ['input.never-on'],
  'input.led-reversed': ['input.never-on'],
  'input.namur': ['input.never-on'],
  'input.dc-sensor-on-ac': ['input.never-on'],
  'input.ac-sensor-on-dc': ['input.never-on'],
  'input.leakage': ['input.never-off', 'input.undefined'],
  'input.cable-capacitance': ['input.never-off', 'input.undefined'],
  'output.ssr-control': ['output.load-underfed'],
};

/** A doubt for want of a datum explains nothing, so it hides nothing. */
const isCause = (finding: Finding) => finding.says.key !== 'finding.lacks';

/** The findings without those that a more exact finding explains. */
export function withoutExplained(findings: Finding[], context: RuleContext): Finding[] {
  const hidden = new Set<string>();
  for (const finding of findings) {
    const { point } = finding.where;
    if (point === undefined || !isCause(finding)) continue;
    for (const rule of hides[finding.rule] ?? []) {
      hidden.add(`${rule} point ${point}`);
      for (const place of context.pointsByAddress.get(point) ?? [])
        if (place.group) hidden.add(`${rule} group ${place.group.group.tag}`);
    }
  }
  return findings.filter(
    ({ rule, where }) =>
      !hidden.has(`${rule} point ${where.point}`) && !hidden.has(`${rule} group ${where.group}`),
  );
}
