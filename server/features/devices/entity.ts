import { Column, Entity, PrimaryColumn } from 'typeorm';

/** Public half of a device key, as the browser exports it. */
export interface PublicKey {
  kty: 'EC';
  crv: 'P-256';
  x: string;
  y: string;
}

@Entity('device')
export class DeviceEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'text' })
  name!: string;
  @Column({ type: 'timestamptz', name: 'registered_at' })
  registeredAt!: Date;
  @Column({ type: 'uuid', name: 'registered_by' })
  registeredBy!: string;
  @Column({ type: 'timestamptz', name: 'revoked_at', nullable: true })
  revokedAt!: Date | null;
  @Column({ type: 'uuid', name: 'revoked_by', nullable: true })
  revokedBy!: string | null;
}

@Entity('device_key')
export class DeviceKeyEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'uuid' })
  device!: string;
  @Column({ type: 'uuid' })
  person!: string;
  @Column({ type: 'jsonb', name: 'public_key' })
  publicKey!: PublicKey;
  /** RFC 7638 SHA-256 thumbprint: one key pair is registered once. */
  @Column({ type: 'text' })
  thumbprint!: string;
  @Column({ type: 'timestamptz', name: 'registered_at' })
  registeredAt!: Date;
}
