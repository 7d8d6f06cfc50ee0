/** The database to work on; every command of this folder takes it from DATABASE_URL. */
export function databaseUrl(): string {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error('DATABASE_URL is not set: it names the PostgreSQL database to work on');
  return url;
}
