/** The invented scenario: sites, people, panels, jobs in every state, sealed records. */
import type { Services } from '../../services';
import { seedJobs } from './seedJobs';
import { seedPanels } from './seedPanels';
import { seedPeople } from './seedPeople';

export async function seedDemo(services: Services): Promise<void> {
  const ids = await seedPeople(services);
  await seedJobs(services, ids, await seedPanels(services, ids));
}
