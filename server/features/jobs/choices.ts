/** Gathers what a job is prepared from: the pinned revision, what was last built, the site's other panels. */
import type { DataSource } from 'typeorm';
import { checkWiring } from '../../../shared/rules/checkWiring';
import type { Findings } from '../../../shared/rules/finding';
import type { Panel } from '../../../shared/panel/panelSchema';
import { notFound } from '../../http/refused';
import type { GivenAcceptance } from '../panels/findingView';
import type { IssuedRevision, RevisionsService } from '../panels/revisions';
import type { SitesService } from '../sites/service';
import type { JobChoice } from './prepare';

/** Revisions and rules never change while a server runs, so what the rules say is kept for the next question. */
const keptRevisions = 8;

export interface ChosenRevision {
  panel: string;
  revision: number;
  points: readonly string[];
}

export class JobChoices {
  private readonly wired = new Map<string, Findings>();

  constructor(
    private readonly database: DataSource,
    private readonly revisions: RevisionsService,
    private readonly sites: SitesService,
  ) {}

  /** The revision; the caller judges by its site who may ask. */
  async revision(panel: string, number: number): Promise<IssuedRevision> {
    const revision = await this.revisions.issued(panel, number);
    if (!revision) throw notFound();
    return revision;
  }

  async of(
    revision: IssuedRevision,
    points: readonly string[],
    acceptances: readonly GivenAcceptance[],
  ): Promise<JobChoice> {
    return {
      panel: revision.content,
      panelDigest: revision.digest,
      wiring: this.wiringOf(revision),
      asBuilt: await this.asBuilt(revision),
      sitePanels: await this.revisions.othersOfSite(revision.site, revision.panel),
      points,
      site: await this.sites.byId(revision.site),
      acceptances: [...revision.standing, ...acceptances],
    };
  }

  private wiringOf({ digest, content }: IssuedRevision): Findings {
    const known = this.wired.get(digest);
    if (known) return known;
    const made = checkWiring(content);
    this.wired.set(digest, made);
    for (const oldest of this.wired.keys()) if (this.wired.size > keptRevisions) this.wired.delete(oldest);
    return made;
  }

  /** panel.md: the revision of the newest sealed job, else the one issued before; undefined when it is this one. */
  private async asBuilt({ panel, number }: IssuedRevision): Promise<Panel | undefined> {
    const rows = await this.database.query<{ revision: number }[]>(
      'SELECT revision FROM job WHERE panel = $1 AND record IS NOT NULL ORDER BY sealed_at DESC LIMIT 1',
      [panel],
    );
    const built = rows[0]?.revision ?? number - 1;
    if (built < 1 || built === number) return undefined;
    return (await this.revisions.issued(panel, built))?.content;
  }
}
