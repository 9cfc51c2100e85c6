import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Acceptance } from '../../../shared/api/panels';
import type { JobRow } from '../../../shared/api/jobs';

/** What the last fold said, in short, so that a board need not fold every job. */
export interface Progress {
  stage: string | null;
  stageDone: number;
  stageOf: number;
  stagesDone: number;
  /** Locks known on, with the name of their owner. */
  locks: { isolator: string; lock: string; person: string }[];
  waiting: JobRow['waiting'];
}

@Entity('job_counter')
export class JobCounterEntity {
  @PrimaryColumn({ type: 'uuid' })
  site!: string;
  @Column({ type: 'integer' })
  last!: number;
}

@Entity('job')
export class JobEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'uuid' })
  site!: string;
  @Column({ type: 'integer' })
  number!: number;
  @Column({ type: 'uuid' })
  panel!: string;
  @Column({ type: 'integer' })
  revision!: number;
  /** Of the pinned revision, which never changes. */
  @Column({ type: 'text', name: 'panel_tag' })
  panelTag!: string;
  @Column({ type: 'text', name: 'panel_name' })
  panelName!: string;
  @Column({ type: 'integer', name: 'panel_points' })
  panelPoints!: number;
  /** Of the lock plan, in opening order. */
  @Column({ type: 'jsonb' })
  isolators!: string[];
  @Column({ type: 'jsonb' })
  scope!: string[];
  @Column({ type: 'uuid' })
  foreman!: string;
  @Column({ type: 'date' })
  due!: string;
  @Column({ type: 'text', nullable: true })
  words!: string | null;
  @Column({ type: 'jsonb' })
  acceptances!: (Acceptance & { by: string })[];
  /** Digest of the request, by which the same request again is known. */
  @Column({ type: 'text', name: 'request_digest' })
  requestDigest!: string;
  @Column({ type: 'timestamptz', name: 'created_at' })
  createdAt!: Date;
  @Column({ type: 'uuid', name: 'created_by' })
  createdBy!: string;
  @Column({ type: 'text', nullable: true })
  pack!: string | null;
  @Column({ type: 'timestamptz', name: 'sent_at', nullable: true })
  sentAt!: Date | null;
  @Column({ type: 'uuid', name: 'sent_by', nullable: true })
  sentBy!: string | null;
  @Column({ type: 'timestamptz', name: 'cancelled_at', nullable: true })
  cancelledAt!: Date | null;
  @Column({ type: 'uuid', name: 'cancelled_by', nullable: true })
  cancelledBy!: string | null;
  @Column({ type: 'text', name: 'cancel_words', nullable: true })
  cancelWords!: string | null;
  @Column({ type: 'uuid', nullable: true })
  record!: string | null;
  @Column({ type: 'timestamptz', name: 'sealed_at', nullable: true })
  sealedAt!: Date | null;
  /** Order of the newest entry; raised under this row's lock, so that order is commit order. */
  @Column({ type: 'integer', name: 'last_order', default: 0 })
  lastOrder!: number;
  @Column({ type: 'timestamptz', name: 'last_heard', nullable: true })
  lastHeard!: Date | null;
  @Column({ type: 'text', default: 'planned' })
  status!: JobRow['status'];
  /** Something of it waits for the foreman. */
  @Column({ type: 'boolean', default: false })
  waits!: boolean;
  @Column({ type: 'jsonb', nullable: true })
  progress!: Progress | null;
  /** Order of the newest entry that `status`, `waits` and `progress` know. */
  @Column({ type: 'integer', name: 'progress_order', default: -1 })
  progressOrder!: number;
}

@Entity('job_person')
export class JobPersonEntity {
  @PrimaryColumn({ type: 'uuid' })
  job!: string;
  @PrimaryColumn({ type: 'uuid' })
  person!: string;
  @Column({ type: 'text' })
  part!: 'electrician' | 'foreman';
}

@Entity('pack')
export class PackEntity {
  @PrimaryColumn({ type: 'text' })
  digest!: string;
  @Column({ type: 'uuid' })
  job!: string;
  /** The canonical JSON that was sent, digest included. */
  @Column({ type: 'text', select: false })
  content!: string;
  @Column({ type: 'timestamptz', name: 'made_at' })
  madeAt!: Date;
  @Column({ type: 'uuid', name: 'made_by' })
  madeBy!: string;
}
