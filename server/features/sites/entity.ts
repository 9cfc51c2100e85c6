import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { SiteSettings } from '../../../shared/api/sites';

@Entity('site')
export class SiteEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;
  @Column({ type: 'text' })
  name!: string;
  @Column({ type: 'jsonb' })
  settings!: SiteSettings;
  @Column({ type: 'integer', default: 1 })
  version!: number;
}
