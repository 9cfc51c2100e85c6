/** The demo's people as the services know who asks. */
import type { Actor } from '../../http/actor';
import type { Services } from '../../services';
import type { DemoSite } from './people';

export interface DemoIds {
  sites: Record<DemoSite, string>;
  /** By the part of their address before the @. */
  people: Map<string, string>;
}

export function idOf(ids: DemoIds, key: string): string {
  const id = ids.people.get(key);
  if (id === undefined) throw new Error(`nobody in the demo is called ${key}`);
  return id;
}

export async function demoActor(services: Services, ids: DemoIds, key: string): Promise<Actor> {
  const actor = await services.people.actor(idOf(ids, key), 1);
  if (!actor) throw new Error(`${key} cannot act`);
  return actor;
}
