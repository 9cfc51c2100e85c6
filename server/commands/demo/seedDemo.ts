/** The invented scenario: sites, people, panels, jobs in every state, sealed records. */
import type { Services } from '../../services';
import { seedPeople } from './seedPeople';

export async function seedDemo(services: Services): Promise<void> {
  await seedPeople(services);
}
