import { defineConfig } from 'drizzle-kit';

export default defineConfig({
  dialect: 'postgresql',
  driver: 'pglite',
  dbCredentials: { url: '.data/db' },
  schema: './api/db/schema/index.ts',
  out: './api/db/migrations',
  casing: 'snake_case',
});
