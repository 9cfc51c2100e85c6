/** Revisions: issued once, never changed, read by jobs. */
import type { DataSource, EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Language } from '../../../shared/api/common';
import type { FindingsAnswer, revisionIssue, RevisionRow, RevisionView } from '../../../shared/api/panels';
import { panelProblems } from '../../../shared/panel/panelIssue';
import type { Panel } from '../../../shared/panel/panelSchema';
import { ruleSetVersion } from '../../../shared/rules/registry';
import type { Actor } from '../../http/actor';
import { notFound, Refused } from '../../http/refused';
import { writeAudit } from '../audit/service';
import type { PeopleService } from '../people/service';
import { changeablePanel, readablePanel } from './access';
import { PanelEntity, PanelRevisionEntity, type Standing } from './entity';
import { placedFinding } from './findingView';
import { othersOfSite } from './lists';
import { revisionRow } from './mapper';
import { standingOf } from './standing';
import { wholePanel } from './wholePanel';

type Issue = z.output<typeof revisionIssue>;

/** A revision as other services know it. */
export interface IssuedRevision {
  panel: string;
  site: string;
  number: number;
  digest: string;
  ruleSet: string;
  content: Panel;
  standing: Standing[];
  /** Newest revision of the panel. */
  newest: number;
}

export class RevisionsService {
  constructor(
    private readonly database: DataSource,
    private readonly people: PeopleService,
  ) {}

  /**
   * Makes the draft a revision nobody can change. The same draft version again is the same revision.
   * @throws Refused 409 when the draft moved on, 422 while something keeps it from being issued.
   */
  issue(actor: Actor, id: string, { version, acceptances }: Issue): Promise<RevisionRow> {
    return this.database.transaction(async (tx) => {
      const panel = await changeablePanel(tx, actor, id);
      const known = await tx.findOneBy(PanelRevisionEntity, { panel: id, draftVersion: version });
      if (known)
        return revisionRow(known, (await this.people.names(tx, [known.issuedBy])).get(known.issuedBy) ?? '');
      if (panel.draftVersion !== version) throw new Refused(409, 'stale');
      const { draft } = await tx.findOneOrFail(PanelEntity, {
        where: { id },
        select: { id: true, draft: true },
      });
      const problems = panelProblems(draft);
      if (problems.length > 0) throw new Refused(422, 'not-issuable', {}, problems.slice(0, 200));
      const findings = wholePanel(draft, await othersOfSite(tx, panel.site, id));
      const revision = {
        panel: id,
        number: (panel.revision ?? 0) + 1,
        digest: panel.draftDigest,
        ruleSet: ruleSetVersion,
        content: draft,
        findings,
        standing: standingOf(findings.findings, acceptances, actor.name),
        draftVersion: version,
        issuedAt: new Date(),
        issuedBy: actor.person,
      };
      await tx.insert(PanelRevisionEntity, revision);
      await tx.update(PanelEntity, { id }, { revision: revision.number, revisionDigest: revision.digest });
      const about = { panel: id, revision: revision.number, digest: revision.digest };
      await writeAudit(tx, { actor: actor.person, site: panel.site, act: 'revision-issued', about });
      return revisionRow(revision, actor.name);
    });
  }

  async view(actor: Actor, panel: string, number: number): Promise<RevisionView> {
    await readablePanel(this.database.manager, actor, panel);
    const revision = await this.load(this.database.manager, panel, number, { content: true });
    const names = await this.people.names(this.database.manager, [revision.issuedBy]);
    return { ...revisionRow(revision, names.get(revision.issuedBy) ?? ''), panel: revision.content };
  }

  /** The findings as they stood when the revision was issued, by the rules of that day. */
  async findings(actor: Actor, panel: string, number: number, language: Language): Promise<FindingsAnswer> {
    await readablePanel(this.database.manager, actor, panel);
    const revision = await this.load(this.database.manager, panel, number, { findings: true });
    const { checks, couldNotRun, findings } = revision.findings;
    return {
      ruleSet: revision.ruleSet,
      checks,
      couldNotRun,
      findings: findings.map((finding) => placedFinding(finding, language, revision.standing)),
      problems: [],
    };
  }

  /** For services that judge access themselves; null when there is no such revision. */
  async issued(panel: string, number: number): Promise<IssuedRevision | null> {
    const tx = this.database.manager;
    const owner = await tx.findOneBy(PanelEntity, { id: panel });
    if (!owner || number < 1 || number > (owner.revision ?? 0)) return null;
    const { digest, ruleSet, content, standing } = await this.load(tx, panel, number, { content: true });
    return {
      panel,
      site: owner.site,
      number,
      digest,
      ruleSet,
      content,
      standing,
      newest: owner.revision ?? 0,
    };
  }

  /** The site's other panels as last issued, without their points. */
  othersOfSite(site: string, panel: string): Promise<Panel[]> {
    return othersOfSite(this.database.manager, site, panel);
  }

  private async load(
    tx: EntityManager,
    panel: string,
    number: number,
    big: { content?: true; findings?: true },
  ): Promise<PanelRevisionEntity> {
    const revision = await tx.findOne(PanelRevisionEntity, {
      where: { panel, number },
      select: {
        panel: true,
        number: true,
        digest: true,
        ruleSet: true,
        standing: true,
        draftVersion: true,
        issuedAt: true,
        issuedBy: true,
        ...big,
      },
    });
    if (!revision) throw notFound();
    return revision;
  }
}
