import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Language } from '../../../shared/api/common';

/** The end of a site's chain; its row is taken by whoever seals. */
@Entity('record_chain')
export class RecordChainEntity {
  @PrimaryColumn({ type: 'uuid' })
  site!: string;
  @Column({ type: 'integer', name: 'last_number' })
  lastNumber!: number;
  @Column({ type: 'text', name: 'last_seal', nullable: true })
  lastSeal!: string | null;
}

@Entity('record')
export class RecordEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'uuid' })
  site!: string;
  @Column({ type: 'integer' })
  number!: number;
  @Column({ type: 'uuid' })
  job!: string;
  /** The first record of the job, when this one was made for entries that came later. */
  @Column({ type: 'uuid', nullable: true })
  amends!: string | null;
  /** Canonical JSON of the document: the bytes of `digest`. */
  @Column({ type: 'text', select: false })
  content!: string;
  @Column({ type: 'text' })
  digest!: string;
  @Column({ type: 'text', name: 'previous_seal', nullable: true })
  previousSeal!: string | null;
  @Column({ type: 'text' })
  seal!: string;
  @Column({ type: 'text' })
  language!: Language;
  @Column({ type: 'timestamptz', name: 'sealed_at' })
  sealedAt!: Date;
  /** Order of the newest entry it covers, and how many set-aside ones it knew of. */
  @Column({ type: 'integer', name: 'last_order' })
  lastOrder!: number;
  @Column({ type: 'integer', name: 'set_aside' })
  setAside!: number;
  /** What the list shows and is searched by, read out of the document. */
  @Column({ type: 'text', name: 'panel_tag' })
  panelTag!: string;
  @Column({ type: 'text', name: 'panel_name' })
  panelName!: string;
  @Column({ type: 'text', name: 'job_number' })
  jobNumber!: string;
  @Column({ type: 'text', array: true })
  electricians!: string[];
  @Column({ type: 'text' })
  foreman!: string;
  @Column({ type: 'uuid', array: true })
  people!: string[];
  @Column({ type: 'text', array: true, select: false })
  points!: string[];
  @Column({ type: 'text', array: true, select: false })
  locks!: string[];
  @Column({ type: 'integer' })
  exceptions!: number;
}

@Entity('record_pdf')
export class RecordPdfEntity {
  @PrimaryColumn({ type: 'uuid' })
  record!: string;
  @Column({ type: 'text' })
  sha256!: string;
  @Column({ type: 'bytea', select: false })
  content!: Buffer;
  @Column({ type: 'timestamptz', name: 'made_at' })
  madeAt!: Date;
}
