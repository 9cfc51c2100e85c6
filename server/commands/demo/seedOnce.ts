/** Fills an empty database with the demo; leaves any other alone. */
import type { Services } from '../../services';
import { seedDemo } from './seedDemo';

export async function seedOnce(services: Services): Promise<void> {
  const known = await services.database.query<unknown[]>('SELECT 1 FROM site LIMIT 1');
  if (known.length > 0) return;
  console.log('Filling the demo ...');
  try {
    await seedDemo(services);
  } catch (error) {
    throw new Error('The demo could not be filled. `npm run demo:reset` empties it and tries again.', {
      cause: error,
    });
  }
}
