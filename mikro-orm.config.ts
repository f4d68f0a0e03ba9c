import { defineConfig } from '@mikro-orm/postgresql';
import { Migrator } from '@mikro-orm/migrations';
import * as entities from './entities';
import { migrations } from './migrations';

export const ormConfig = (databaseUrl: string) =>
  defineConfig({
    clientUrl: databaseUrl,
    entities: Object.values(entities),
    extensions: [Migrator],
    pool: { min: 0, max: 10 },
    discovery: { warnWhenNoEntities: true, checkDuplicateTableNames: true },
    migrations: { migrationsList: migrations, snapshot: false, tableName: 'schema_migration', transactional: true },
  });

export default ormConfig(process.env.DATABASE_URL ?? 'postgresql://localhost/chaffline');
