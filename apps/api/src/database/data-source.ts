import { DataSource, DataSourceOptions } from 'typeorm';
import { entities } from './entities';
import { migrations } from './migrations';
import { SnakeNames } from './snake-names';

export function dataSourceOptions(url: string, poolSize = 10): DataSourceOptions {
  return {
    type: 'postgres',
    url,
    entities,
    migrations,
    migrationsTransactionMode: 'each',
    namingStrategy: new SnakeNames(),
    uuidExtension: 'pgcrypto',
    installExtensions: false,
    poolSize,
    applicationName: 'halfpitch',
  };
}

/** For TypeORM's command line, on the built file: migrations are made and run as the owner of the tables. */
export default new DataSource(dataSourceOptions(process.env.DATABASE_OWNER_URL ?? ''));
