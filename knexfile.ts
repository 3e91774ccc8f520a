import type { Knex } from 'knex';
import { knexConfig } from './db/connection';

const url = process.env.MIGRATION_DATABASE_URL ?? process.env.DATABASE_URL ?? 'mysql://root@127.0.0.1:3306/fumelore';

const config: Knex.Config = {
  ...knexConfig(url, 2),
  migrations: { directory: './db/migrations', extension: 'ts', loadExtensions: ['.ts'] },
};

export default config;
