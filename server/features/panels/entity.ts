import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Panel } from '../../../shared/panel/panelSchema';
import type { Findings } from '../../../shared/rules/finding';

@Entity('panel')
export class PanelEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'uuid' })
  site!: string;
  @Column({ type: 'text' })
  tag!: string;
  @Column({ type: 'text' })
  name!: string;
  @Column({ type: 'text' })
  location!: string;
  @Column({ type: 'integer' })
  points!: number;
  /** Up to 40 MB: read only where the draft itself is asked for. */
  @Column({ type: 'jsonb', select: false })
  draft!: Panel;
  @Column({ type: 'text', name: 'draft_digest' })
  draftDigest!: string;
  @Column({ type: 'integer', name: 'draft_version', default: 1 })
  draftVersion!: number;
  @Column({ type: 'timestamptz', name: 'draft_changed_at' })
  draftChangedAt!: Date;
  @Column({ type: 'uuid', name: 'draft_changed_by' })
  draftChangedBy!: string;
  /** Digest of what was uploaded, by which a repeated upload is known. */
  @Column({ type: 'text', name: 'upload_digest' })
  uploadDigest!: string;
  /** Number of the newest issued revision. */
  @Column({ type: 'integer', nullable: true })
  revision!: number | null;
  @Column({ type: 'text', name: 'revision_digest', nullable: true })
  revisionDigest!: string | null;
}

/** A finding that somebody accepted when the revision was issued. */
export interface Standing {
  rule: string;
  place: string;
  reason: string;
  by: string;
}

@Entity('panel_revision')
export class PanelRevisionEntity {
  @PrimaryColumn({ type: 'uuid' })
  panel!: string;
  @PrimaryColumn({ type: 'integer' })
  number!: number;
  @Column({ type: 'text' })
  digest!: string;
  @Column({ type: 'text', name: 'rule_set' })
  ruleSet!: string;
  @Column({ type: 'jsonb', select: false })
  content!: Panel;
  @Column({ type: 'jsonb', select: false })
  findings!: Findings;
  @Column({ type: 'jsonb' })
  standing!: Standing[];
  @Column({ type: 'integer', name: 'draft_version' })
  draftVersion!: number;
  @Column({ type: 'timestamptz', name: 'issued_at' })
  issuedAt!: Date;
  @Column({ type: 'uuid', name: 'issued_by' })
  issuedBy!: string;
}
