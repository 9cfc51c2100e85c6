/** The findings that concern the loop of one point, each with the sign that stands in its picture. */
import type { FindingView } from '../../../shared/api/panels';
import type { PlaceMark } from '../../../shared/diagram/placeMarks';
import type { Panel, Point } from '../../../shared/panel/panelSchema';

export interface SignedFinding {
  finding: FindingView;
  mark: PlaceMark;
}

type Where = FindingView['where'];

/** The narrowest place of a finding that is part of this loop; undefined when it concerns another. */
function placeIn(panel: Panel, point: Point, where: Where): PlaceMark['at'] | undefined {
  const group = panel.groups.find(({ tag }) => tag === point.group);
  if (where.point !== undefined) return where.point === point.address ? 'point' : undefined;
  if (where.terminal !== undefined) return where.terminal === point.terminal ? 'terminal' : undefined;
  if (where.group !== undefined) return where.group === point.group ? 'group' : undefined;
  if (where.module !== undefined) return where.module === group?.module ? 'module' : undefined;
  return where.supply !== undefined && where.supply === group?.supply ? 'supply' : undefined;
}

/** Signs count from 1, in the order of the findings. */
export function pointFindings(panel: Panel, point: Point, findings: readonly FindingView[]): SignedFinding[] {
  const here = findings.flatMap((finding) => {
    const at = placeIn(panel, point, finding.where);
    return at ? [{ finding, at }] : [];
  });
  return here.map(({ finding, at }, index) => ({ finding, mark: { at, sign: String(index + 1) } }));
}
