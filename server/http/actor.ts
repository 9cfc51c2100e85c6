/** Who is asking: a signed-in person with their roles. Services take it to bound what they see and change. */
import type { Language, Role } from '../../shared/api/common';

export interface Actor {
  person: string;
  name: string;
  email: string;
  language: Language;
  roles: { site: string; role: Role }[];
}

/** Sites where the actor holds one of these roles (any role when none is named). */
export function sitesOf(actor: Actor, ...roles: Role[]): string[] {
  const held = actor.roles.filter((each) => roles.length === 0 || roles.includes(each.role));
  return [...new Set(held.map((each) => each.site))];
}

export const holds = (actor: Actor, site: string, ...roles: Role[]): boolean =>
  sitesOf(actor, ...roles).includes(site);
