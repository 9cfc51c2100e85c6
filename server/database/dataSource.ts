/** The database as TypeORM sees it: entities and migrations by name, nothing synchronised on its own. */
import { DataSource } from 'typeorm';
import { DeviceEntity, DeviceKeyEntity } from '../features/devices/entity';
import { EntryEntity, SetAsideEntity } from '../features/entries/entity';
import { JobCounterEntity, JobEntity, JobPersonEntity, PackEntity } from '../features/jobs/entity';
import { PanelEntity, PanelRevisionEntity } from '../features/panels/entity';
import { MailTokenEntity, PersonEntity, PersonRoleEntity } from '../features/people/entity';
import { RecordChainEntity, RecordEntity, RecordPdfEntity } from '../features/records/entity';
import { SiteEntity } from '../features/sites/entity';
import { Ground1764547200000 } from './migrations/1764547200000-Ground';
import { Panels1764547260000 } from './migrations/1764547260000-Panels';
import { Devices1764547320000 } from './migrations/1764547320000-Devices';
import { Jobs1764547380000 } from './migrations/1764547380000-Jobs';
import { Entries1764547440000 } from './migrations/1764547440000-Entries';
import { Records1764547500000 } from './migrations/1764547500000-Records';

const entities = [
  SiteEntity,
  PersonEntity,
  PersonRoleEntity,
  MailTokenEntity,
  PanelEntity,
  PanelRevisionEntity,
  DeviceEntity,
  DeviceKeyEntity,
  JobCounterEntity,
  JobEntity,
  JobPersonEntity,
  PackEntity,
  EntryEntity,
  SetAsideEntity,
  RecordChainEntity,
  RecordEntity,
  RecordPdfEntity,
];
const migrations = [
  Ground1764547200000,
  Panels1764547260000,
  Devices1764547320000,
  Jobs1764547380000,
  Entries1764547440000,
  Records1764547500000,
];

/** As the owner of the tables: for migrations only. */
export const ownerDataSource = (url: string): DataSource =>
  new DataSource({ type: 'postgres', url, entities, migrations, synchronize: false, logging: false });

/** As `coldloop_app`, which owns no table and so cannot lift the append-only triggers. */
export const appDataSource = (url: string): DataSource =>
  new DataSource({
    type: 'postgres',
    url,
    entities,
    migrations: [],
    synchronize: false,
    logging: false,
    extra: { max: 20, options: '-c role=coldloop_app' },
  });
