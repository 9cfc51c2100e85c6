/** Who did what, insert-only: one line in the same transaction as its cause. */
import { v7 } from 'uuid';
import type { EntityManager } from 'typeorm';

export interface AuditLine {
  actor: string | null;
  site: string | null;
  act: string;
  about: Record<string, unknown>;
}

export async function writeAudit(tx: EntityManager, line: AuditLine): Promise<void> {
  await tx.query('INSERT INTO audit (id, actor, site, act, about) VALUES ($1, $2, $3, $4, $5)', [
    v7(),
    line.actor,
    line.site,
    line.act,
    JSON.stringify(line.about),
  ]);
}
