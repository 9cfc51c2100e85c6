/** The list of devices as an administrator sees it. */
import type { EntityManager } from 'typeorm';
import type { DeviceView } from '../../../shared/api/jobs';

interface Row {
  id: string;
  name: string;
  registered_at: Date;
  revoked_at: Date | null;
  people: DeviceView['people'];
  last_heard: Date | null;
}

const view = (row: Row): DeviceView => ({
  id: row.id,
  name: row.name,
  registeredAt: row.registered_at.toISOString(),
  revokedAt: row.revoked_at?.toISOString() ?? null,
  people: row.people,
  lastHeard: row.last_heard?.toISOString() ?? null,
});

/** Devices that hold a key of somebody with a role on one of these sites; of their people only those. */
export async function deviceViews(
  tx: EntityManager,
  sites: readonly string[],
  device: string | null = null,
): Promise<DeviceView[]> {
  const rows = await tx.query<Row[]>(
    `SELECT d.id, d.name, d.registered_at, d.revoked_at,
       json_agg(DISTINCT jsonb_build_object('id', p.id, 'name', p.name)) AS people,
       max(heard.at) AS last_heard
     FROM device d
     JOIN device_key k ON k.device = d.id
     JOIN person p ON p.id = k.person
     LEFT JOIN LATERAL (SELECT max(e.received_at) AS at FROM entry e WHERE e.key = k.id) heard ON true
     WHERE ($2::uuid IS NULL OR d.id = $2)
       AND EXISTS (SELECT FROM person_role r WHERE r.person = p.id AND r.site = ANY($1))
     GROUP BY d.id ORDER BY lower(d.name), d.id`,
    [sites, device],
  );
  return rows.map(view);
}
