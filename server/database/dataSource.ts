/** The database as TypeORM sees it: entities and migrations by name, nothing synchronised on its own. */
import { DataSource } from 'typeorm';
import { MailTokenEntity, PersonEntity, PersonRoleEntity } from '../features/people/entity';
import { SiteEntity } from '../features/sites/entity';
import { Ground1764547200000 } from './migrations/1764547200000-Ground';

const entities = [SiteEntity, PersonEntity, PersonRoleEntity, MailTokenEntity];
const migrations = [Ground1764547200000];

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
