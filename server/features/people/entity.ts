import { Column, Entity, OneToMany, ManyToOne, JoinColumn, PrimaryColumn, type Relation } from 'typeorm';
import type { Language, Role } from '../../../shared/api/common';

@Entity('person')
export class PersonEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'text' })
  name!: string;
  @Column({ type: 'text' })
  email!: string;
  @Column({ type: 'text' })
  language!: Language;
  @Column({ type: 'text', name: 'password_hash', nullable: true })
  passwordHash!: string | null;
  @Column({ type: 'boolean', default: true })
  active!: boolean;
  /** Raised on password or role change; sessions of an older epoch end. */
  @Column({ type: 'integer', default: 1 })
  epoch!: number;
  @Column({ type: 'integer', default: 1 })
  version!: number;
  @Column({ type: 'timestamptz', name: 'invited_at', nullable: true })
  invitedAt!: Date | null;
  @Column({ type: 'timestamptz', name: 'joined_at', nullable: true })
  joinedAt!: Date | null;
  @OneToMany(() => PersonRoleEntity, (role) => role.holder)
  roles!: Relation<PersonRoleEntity[]>;
}

@Entity('person_role')
export class PersonRoleEntity {
  @PrimaryColumn({ type: 'uuid' })
  person!: string;
  @PrimaryColumn({ type: 'uuid' })
  site!: string;
  @PrimaryColumn({ type: 'text' })
  role!: Role;
  @ManyToOne(() => PersonEntity, (person) => person.roles)
  @JoinColumn({ name: 'person' })
  holder!: Relation<PersonEntity>;
}

@Entity('mail_token')
export class MailTokenEntity {
  @PrimaryColumn({ type: 'text' })
  hash!: string;
  @Column({ type: 'text' })
  kind!: 'invitation' | 'password-reset';
  @Column({ type: 'uuid' })
  person!: string;
  @Column({ type: 'timestamptz', name: 'expires_at' })
  expiresAt!: Date;
  @Column({ type: 'timestamptz', name: 'used_at', nullable: true })
  usedAt!: Date | null;
}
