/** Uploads the demo's panels as the engineer and issues those that can be issued. */
import { v7 } from 'uuid';
import type { Panel } from '../../../shared/panel/panelSchema';
import type { Services } from '../../services';
import { demoActor, type DemoIds } from './demoActor';
import { benchRigPanel } from './panels/benchRig';
import { faultyPanel } from './panels/faulty';
import { healthyPanel } from './panels/healthy';
import { longCablesPanel } from './panels/longCables';
import { mixedPanel } from './panels/mixed';

export type DemoPanel = 'healthy' | 'mixed' | 'longCables' | 'benchRig';

async function upload(services: Services, ids: DemoIds, panel: Panel): Promise<string> {
  const id = v7();
  await services.panels.upload(await demoActor(services, ids, 'nora'), {
    id,
    site: ids.sites.waterWorks,
    panel,
  });
  return id;
}

async function issued(services: Services, ids: DemoIds, panel: Panel): Promise<string> {
  const id = await upload(services, ids, panel);
  await services.revisions.issue(await demoActor(services, ids, 'nora'), id, { version: 1, acceptances: [] });
  return id;
}

/** The faulty panel stays a draft: nothing in it may be worked on. */
export async function seedPanels(services: Services, ids: DemoIds): Promise<Record<DemoPanel, string>> {
  const panels = {
    healthy: await issued(services, ids, healthyPanel),
    mixed: await issued(services, ids, mixedPanel),
    longCables: await issued(services, ids, longCablesPanel),
    benchRig: await issued(services, ids, benchRigPanel),
  };
  await upload(services, ids, faultyPanel);
  return panels;
}
