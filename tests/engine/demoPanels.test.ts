/** The sound panels of the demo: they fit the file format, can be issued, and nothing in them stops a job. */
import { describe, expect, it } from 'vitest';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { benchRigPanel } from '../../server/commands/demo/panels/benchRig';
import { longCablesPanel } from '../../server/commands/demo/panels/longCables';
import { mixedPanel, mixedScope } from '../../server/commands/demo/panels/mixed';
import { checkPanel } from '../../shared/checklist/panelCheck';
import { panelSchema } from '../../shared/panel/panelSchema';

const panels = [
  ['healthy', healthyPanel],
  ['mixed', mixedPanel],
  ['long-cable', longCablesPanel],
  ['bench', benchRigPanel],
] as const;

describe.each(panels)('the %s panel', (_name, panel) => {
  const result = checkPanel({
    panel,
    sitePanels: panels.map(([, one]) => one).filter((one) => one !== panel),
  });
  it('fits the schema as it stands and can be issued', () => {
    expect(panelSchema.parse(panel)).toEqual(panel);
    expect(result.problems).toEqual([]);
  });
  it('has a safe plan and a checklist', () => {
    expect(result.plan?.isolators.length).toBeGreaterThan(0);
    expect(result.checklist?.steps.length).toBeGreaterThan(100);
  });
  it('has nothing that stops a job, after every check ran', () => {
    expect(
      result.findings.filter(({ harm }) => harm !== 'tells').map(({ rule, where }) => [rule, where]),
    ).toEqual([]);
    expect(result.couldNotRun).toEqual([]);
    expect(result.checks).toBeGreaterThan(10 * panel.points.length);
  });
});

describe('the job of four points on the mixed panel', () => {
  const result = checkPanel({ panel: mixedPanel, scope: mixedScope });
  it('locks its own disconnect and the isolator in the other panel', () => {
    expect(result.plan?.isolators.map(({ isolator }) => isolator.tag)).toEqual(['Q1', 'F12']);
  });
  it('finds the relay card’s second common live with its own disconnect open', () => {
    expect(result.stillLive.find(({ terminal }) => terminal === 'X5:C2')).toMatchObject({
      V: 120,
      maybe: false,
    });
  });
  it('is a sensor, a dry contact, a relay output on the foreign supply and a 24 V valve with its diode', () => {
    const points = mixedScope.map((address) => mixedPanel.points.find((one) => one.address === address));
    const groups = points.map((one) => mixedPanel.groups.find(({ tag }) => tag === one?.group));
    expect(points.map((one) => one?.device.kind)).toEqual(['pnp', 'contact', 'load', 'load']);
    expect(groups[2]?.supply).toBe('S120');
    expect([groups[3]?.supply, points[3]?.suppressor?.kind]).toEqual(['S24', 'diode']);
  });
});
