import { defineConfig } from 'drizzle-kit';

/** Migrations are written from the schema without a database: `npx drizzle-kit generate --name <what-changes>`. */
export default defineConfig({
  dialect: 'postgresql',
  schema: './db/schema',
  out: './db/migrations',
});
