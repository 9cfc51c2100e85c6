/** Who may see and change panels; a panel of another site does not exist for them. */
import type { EntityManager } from 'typeorm';
import { holds, type Actor } from '../../http/actor';
import { forbidden, notFound } from '../../http/refused';
import { PanelEntity } from './entity';
import { panelEditors, panelReaders } from './roles';

/** @throws Refused 404 when the panel is not on a site where the actor may read panels. */
export async function readablePanel(tx: EntityManager, actor: Actor, id: string): Promise<PanelEntity> {
  const panel = await tx.findOneBy(PanelEntity, { id });
  if (!panel || !holds(actor, panel.site, ...panelReaders)) throw notFound();
  return panel;
}

/** Takes the panel's row for a change until the transaction ends. */
export async function changeablePanel(tx: EntityManager, actor: Actor, id: string): Promise<PanelEntity> {
  const panel = await tx.findOne(PanelEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
  if (!panel || !holds(actor, panel.site, ...panelReaders)) throw notFound();
  if (!holds(actor, panel.site, ...panelEditors)) throw forbidden();
  return panel;
}
