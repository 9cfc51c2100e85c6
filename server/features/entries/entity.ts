import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('entry')
export class EntryEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'uuid' })
  job!: string;
  @Column({ type: 'integer' })
  order!: number;
  @Column({ type: 'uuid' })
  log!: string;
  @Column({ type: 'integer' })
  seq!: number;
  /** SHA-256 of the whole entry, signature included: what the next one of its log names as `previous`. */
  @Column({ type: 'text' })
  hash!: string;
  @Column({ type: 'text', nullable: true })
  previous!: string | null;
  @Column({ type: 'text' })
  kind!: string;
  @Column({ type: 'text' })
  pack!: string;
  @Column({ type: 'uuid' })
  key!: string;
  /** Its canonical JSON: the bytes that were signed and hashed. */
  @Column({ type: 'text' })
  content!: string;
  @Column({ type: 'timestamptz', name: 'received_at' })
  receivedAt!: Date;
  /** Received after its person's access had ended: kept as history, its locks need confirming. */
  @Column({ type: 'boolean', name: 'after_access' })
  afterAccess!: boolean;
}

/** Another entry holds this one's id: kept, not folded, until the foreman decides. */
@Entity('entry_set_aside')
export class SetAsideEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @PrimaryColumn({ type: 'text' })
  hash!: string;
  @Column({ type: 'uuid' })
  job!: string;
  @Column({ type: 'uuid' })
  log!: string;
  @Column({ type: 'integer' })
  seq!: number;
  @Column({ type: 'text' })
  kind!: string;
  @Column({ type: 'uuid' })
  key!: string;
  @Column({ type: 'text' })
  content!: string;
  @Column({ type: 'timestamptz', name: 'received_at' })
  receivedAt!: Date;
}
