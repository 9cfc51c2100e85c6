/** Reads of many panels at once. */
import type { EntityManager } from 'typeorm';
import type { Panel } from '../../../shared/panel/panelSchema';
import type { PanelEntity } from './entity';

/** The cursor of a panel in a list by tag. */
export const keysetOf = ({ tag, id }: Pick<PanelEntity, 'tag' | 'id'>): string => `${id}${tag}`;
const uuidLength = 36;

interface KeysQuery {
  after?: string | undefined;
  limit: number;
}

/** One more than asked for, so that the caller sees whether there is a next page. */
export function panelKeys(
  tx: EntityManager,
  sites: readonly string[],
  { after, limit }: KeysQuery,
): Promise<{ id: string }[]> {
  const parameters = [
    sites,
    after?.slice(uuidLength) ?? null,
    after?.slice(0, uuidLength) ?? null,
    limit + 1,
  ];
  return tx.query(
    `SELECT id FROM panel WHERE site = ANY($1) AND ($2::text IS NULL OR (tag, id::text) > ($2, $3))
     ORDER BY tag, id::text LIMIT $4`,
    parameters,
  );
}

/** How many jobs of each panel have not ended. */
export async function openJobsOf(tx: EntityManager, panels: readonly string[]): Promise<Map<string, number>> {
  const rows = await tx.query<{ panel: string; jobs: number }[]>(
    `SELECT panel, count(*)::int AS jobs FROM job
     WHERE panel = ANY($1) AND status NOT IN ('sealed', 'cancelled') GROUP BY panel`,
    [panels],
  );
  return new Map(rows.map(({ panel, jobs }) => [panel, jobs]));
}

/** The other panels of the site as last issued: what they say of devices that two panels share. */
export async function othersOfSite(tx: EntityManager, site: string, panel: string): Promise<Panel[]> {
  const rows = await tx.query<{ content: Panel }[]>(
    `SELECT jsonb_set(r.content, '{points}', '[]') AS content FROM panel p
     JOIN panel_revision r ON r.panel = p.id AND r.number = p.revision
     WHERE p.site = $1 AND p.id <> $2 ORDER BY p.tag`,
    [site, panel],
  );
  return rows.map(({ content }) => content);
}
