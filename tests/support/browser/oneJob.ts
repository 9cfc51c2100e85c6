/** The people of the demo, its mixed panel issued, and one job of four points waiting for Ines Varga. */
import { v7 } from 'uuid';
import { demoActor, idOf } from '../../../server/commands/demo/demoActor';
import { mixedPanel, mixedScope } from '../../../server/commands/demo/panels/mixed';
import { seedPeople } from '../../../server/commands/demo/seedPeople';
import type { Services } from '../../../server/services';

export async function seedOneJob(services: Services): Promise<void> {
  const ids = await seedPeople(services);
  const engineer = await demoActor(services, ids, 'nora');
  const panel = v7();
  await services.panels.upload(engineer, { id: panel, site: ids.sites.waterWorks, panel: mixedPanel });
  await services.revisions.issue(engineer, panel, { version: 1, acceptances: [] });
  const foreman = await demoActor(services, ids, 'ruth');
  const job = v7();
  await services.jobs.create(foreman, {
    id: job,
    panel,
    revision: 1,
    points: [...mixedScope],
    electricians: [idOf(ids, 'ines')],
    foreman: foreman.person,
    due: '2027-01-15',
    words: 'The eyewash must stay in service. Ask the dosing room before you start.',
    acceptances: [],
  });
  await services.jobs.send(foreman, job);
}
