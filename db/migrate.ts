import { fileURLToPath } from 'node:url';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { connect } from './connect';

const migrationsFolder = fileURLToPath(new URL('./migrations', import.meta.url));

/** Any number that no other program on the same server is likely to pick. */
const MIGRATION_LOCK = 7_653_901;

/**
 * Brings the database at `url` up to the newest migration. Two starts at once wait for each other;
 * a database already up to date is left as it is.
 */
export async function migrateDatabase(url: string): Promise<void> {
  const { db, pool, close } = connect(url, { most: 2 });
  try {
    const holder = await pool.connect();
    try {
      await holder.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
      await migrate(db, { migrationsFolder });
    } finally {
      await holder.query('select pg_advisory_unlock($1)', [MIGRATION_LOCK]);
      holder.release();
    }
  } finally {
    await close();
  }
}

/** `npm run db:migrate`: the same from the command line. */
if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const url = process.env.DATABASE_URL;
  if (url === undefined) {
    process.stderr.write('DATABASE_URL: the address of the database is needed, postgres://…\n');
    process.exit(1);
  }
  await migrateDatabase(url);
}
