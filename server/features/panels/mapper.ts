import type { PanelRow, RevisionRow } from '../../../shared/api/panels';
import type { PanelEntity, PanelRevisionEntity } from './entity';

export const panelRow = (panel: PanelEntity, openJobs: number): PanelRow => ({
  id: panel.id,
  site: panel.site,
  tag: panel.tag,
  name: panel.name,
  location: panel.location,
  points: panel.points,
  revision: panel.revision,
  draftChanged: panel.revisionDigest !== panel.draftDigest,
  openJobs,
});

type IssuedFacts = Pick<PanelRevisionEntity, 'number' | 'digest' | 'issuedAt' | 'ruleSet' | 'standing'>;

export const revisionRow = (revision: IssuedFacts, issuedBy: string): RevisionRow => ({
  number: revision.number,
  digest: revision.digest,
  issuedAt: revision.issuedAt.toISOString(),
  issuedBy,
  ruleSet: revision.ruleSet,
  standing: revision.standing.map(({ rule, place, reason, by }) => ({ rule, place, reason, by })),
});
