import { DataSource, type DataSourceOptions } from 'typeorm';
import { migrations } from './migrations.js';
import { SnakeNamingStrategy } from './snake-naming.strategy.js';

/** Options of the API's pool. Inside a transaction only its own manager is used, so a starved pool fails fast. */
export function databaseOptions(url: string): DataSourceOptions {
  return {
    type: 'postgres',
    url,
    schema: 'metewand',
    installExtensions: false,
    uuidExtension: 'pgcrypto',
    namingStrategy: new SnakeNamingStrategy(),
    poolSize: 10,
    extra: {
      connectionTimeoutMillis: 3_000,
      statement_timeout: 8_000,
      idle_in_transaction_session_timeout: 10_000,
    },
  };
}

/** The owner's connection, for migrations only. */
export function ownerDataSource(url: string): DataSource {
  return new DataSource({
    type: 'postgres',
    url,
    schema: 'metewand',
    installExtensions: false,
    uuidExtension: 'pgcrypto',
    migrations,
    migrationsTransactionMode: 'each',
  });
}
