/** Panels and their drafts: taken in, changed with a version check, listed, shown. */
import { In, QueryFailedError, type DataSource, type EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Language, Page } from '../../../shared/api/common';
import type { draftSave, FindingsAnswer, panelUpload, PanelRow, PanelView } from '../../../shared/api/panels';
import { digestOf } from '../../../shared/panel/canonical';
import { panelProblems } from '../../../shared/panel/panelIssue';
import type { Panel } from '../../../shared/panel/panelSchema';
import { ruleSetVersion } from '../../../shared/rules/registry';
import { holds, sitesOf, type Actor } from '../../http/actor';
import { notFound, Refused } from '../../http/refused';
import { writeAudit } from '../audit/service';
import type { PeopleService } from '../people/service';
import { changeablePanel, readablePanel } from './access';
import { PanelEntity, PanelRevisionEntity } from './entity';
import { placedFinding } from './findingView';
import { keysetOf, openJobsOf, othersOfSite, panelKeys } from './lists';
import { panelRow, revisionRow } from './mapper';
import { panelEditors, panelReaders } from './roles';
import { wholePanel } from './wholePanel';

type Upload = z.output<typeof panelUpload>;
type Save = z.output<typeof draftSave>;
interface ListQuery {
  site?: string | undefined;
  after?: string | undefined;
  limit: number;
}

/** PostgreSQL's code for a broken unique constraint: an id, or a tag on a site. */
function isTaken(error: unknown): boolean {
  if (!(error instanceof QueryFailedError)) return false;
  const thrown: unknown = error.driverError;
  return typeof thrown === 'object' && thrown !== null && 'code' in thrown && thrown.code === '23505';
}

async function orTagTaken<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    throw isTaken(error) ? new Refused(409, 'tag-taken') : error;
  }
}

const draftOf = (panel: Panel, digest: string, by: string) => ({
  tag: panel.tag,
  name: panel.name,
  location: panel.location,
  points: panel.points.length,
  draft: panel,
  draftDigest: digest,
  draftChangedAt: new Date(),
  draftChangedBy: by,
});

export class PanelsService {
  constructor(
    private readonly database: DataSource,
    private readonly people: PeopleService,
  ) {}

  /** Takes a panel file in as a new panel. The same id with the same file is the same upload, answered the same way. */
  async upload(actor: Actor, { id, site, panel }: Upload): Promise<PanelRow> {
    if (!holds(actor, site, ...panelEditors)) throw notFound();
    const digest = digestOf(panel);
    const before = () => this.uploadedBefore(id, site, digest);
    const known = await before();
    if (known) return known;
    try {
      return await this.insert(actor, { id, site, panel }, digest);
    } catch (error) {
      if (!isTaken(error)) throw error;
      // Sent twice at the same moment, the other one was first.
      const first = await before();
      if (first) return first;
      throw new Refused(409, 'tag-taken');
    }
  }

  private insert(actor: Actor, { id, site, panel }: Upload, digest: string): Promise<PanelRow> {
    return this.database.transaction(async (tx) => {
      const draft = draftOf(panel, digest, actor.person);
      await tx.insert(PanelEntity, {
        id,
        site,
        ...draft,
        uploadDigest: digest,
        revision: null,
        revisionDigest: null,
      });
      const about = { panel: id, tag: panel.tag, digest };
      await writeAudit(tx, { actor: actor.person, site, act: 'panel-uploaded', about });
      return panelRow(await tx.findOneByOrFail(PanelEntity, { id }), 0);
    });
  }

  private async uploadedBefore(id: string, site: string, digest: string): Promise<PanelRow | null> {
    const tx = this.database.manager;
    const known = await tx.findOneBy(PanelEntity, { id });
    if (!known) return null;
    if (known.site !== site || known.uploadDigest !== digest) throw new Refused(409, 'id-taken');
    return panelRow(known, (await openJobsOf(tx, [id])).get(id) ?? 0);
  }

  /** Puts a panel file in place of the draft. A save that was sent twice is answered as once. */
  saveDraft(actor: Actor, id: string, { version, panel }: Save): Promise<PanelRow> {
    const digest = digestOf(panel);
    return orTagTaken(
      this.database.transaction(async (tx) => {
        const known = await changeablePanel(tx, actor, id);
        const again = known.draftVersion === version + 1 && known.draftDigest === digest;
        if (!again) {
          if (known.draftVersion !== version) throw await this.stale(tx, known);
          const next = { ...draftOf(panel, digest, actor.person), draftVersion: version + 1 };
          await tx.update(PanelEntity, { id }, next);
          const about = { panel: id, digest, version: version + 1 };
          await writeAudit(tx, { actor: actor.person, site: known.site, act: 'draft-saved', about });
        }
        const saved = await tx.findOneByOrFail(PanelEntity, { id });
        return panelRow(saved, (await openJobsOf(tx, [id])).get(id) ?? 0);
      }),
    );
  }

  /** Says what stands instead, so that the person can look before they decide. */
  private async stale(tx: EntityManager, panel: PanelEntity): Promise<Refused> {
    const names = await this.people.names(tx, [panel.draftChangedBy]);
    const stands = {
      version: panel.draftVersion,
      digest: panel.draftDigest,
      changedAt: panel.draftChangedAt.toISOString(),
      changedBy: names.get(panel.draftChangedBy) ?? '',
    };
    return new Refused(409, 'stale', {}, [], {}, { stands });
  }

  async list(actor: Actor, query: ListQuery): Promise<Page<PanelRow>> {
    const sites = sitesOf(actor, ...panelReaders).filter(
      (site) => query.site === undefined || site === query.site,
    );
    const tx = this.database.manager;
    const keys = await panelKeys(tx, sites, query);
    const shown = keys.slice(0, query.limit).map(({ id }) => id);
    const panels = await tx.findBy(PanelEntity, { id: In(shown) });
    const jobs = await openJobsOf(tx, shown);
    const byId = new Map(panels.map((panel) => [panel.id, panel]));
    const items = shown.flatMap((id) => byId.get(id) ?? []);
    const last = items.at(-1);
    return {
      items: items.map((panel) => panelRow(panel, jobs.get(panel.id) ?? 0)),
      next: keys.length > query.limit && last ? keysetOf(last) : null,
    };
  }

  async view(actor: Actor, id: string): Promise<PanelView> {
    const tx = this.database.manager;
    const panel = await readablePanel(tx, actor, id);
    const revisions = await tx.find(PanelRevisionEntity, { where: { panel: id }, order: { number: 'DESC' } });
    const names = await this.people.names(tx, [
      panel.draftChangedBy,
      ...revisions.map((each) => each.issuedBy),
    ]);
    return {
      ...panelRow(panel, (await openJobsOf(tx, [id])).get(id) ?? 0),
      draft: {
        version: panel.draftVersion,
        panel: await this.draft(tx, id),
        changedAt: panel.draftChangedAt.toISOString(),
        changedBy: names.get(panel.draftChangedBy) ?? '',
      },
      revisions: revisions.map((each) => revisionRow(each, names.get(each.issuedBy) ?? '')),
    };
  }

  /** What the engines say about the draft, and what keeps it from being issued. */
  async draftFindings(actor: Actor, id: string, language: Language): Promise<FindingsAnswer> {
    const tx = this.database.manager;
    const { site } = await readablePanel(tx, actor, id);
    const draft = await this.draft(tx, id);
    const found = wholePanel(draft, await othersOfSite(tx, site, id));
    return {
      ruleSet: ruleSetVersion,
      checks: found.checks,
      couldNotRun: found.couldNotRun,
      findings: found.findings.map((finding) => placedFinding(finding, language, [])),
      problems: panelProblems(draft),
    };
  }

  private async draft(tx: EntityManager, id: string): Promise<Panel> {
    const row = await tx.findOneOrFail(PanelEntity, { where: { id }, select: { id: true, draft: true } });
    return row.draft;
  }
}
