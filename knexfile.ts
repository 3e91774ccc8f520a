import { knexConfig } from './db/connection';

/** For changes of shape: a big table may take its time, and one connection is enough. */
const url = process.env.MIGRATION_DATABASE_URL || process.env.DATABASE_URL;
if (!url) throw new Error('MIGRATION_DATABASE_URL is not set: npm run db:migrate sets it.');

const config = {
  ...knexConfig(url, { max: 2, statementSeconds: 0 }),
  migrations: { directory: './db/migrations', extension: 'ts', loadExtensions: ['.ts'] },
};

export default config;
