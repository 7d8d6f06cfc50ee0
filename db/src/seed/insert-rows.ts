import type { Client } from 'pg';

/**
 * Inserts rows of one shape with parameters, a hundred at a time.
 * Objects go in as JSON; arrays of numbers as PostgreSQL arrays.
 */
export async function insertRows(
  client: Client,
  table: string,
  rows: readonly Record<string, unknown>[],
): Promise<void> {
  const first = rows[0];
  if (!first) return;
  const columns = Object.keys(first);
  for (let start = 0; start < rows.length; start += 100) {
    const part = rows.slice(start, start + 100);
    const values = part.flatMap((row) =>
      columns.map((column) => {
        const value = row[column];
        const json = typeof value === 'object' && value !== null && !Array.isArray(value);
        return json ? JSON.stringify(value) : value;
      }),
    );
    const places = part.map(
      (_, row) => `(${columns.map((__, column) => `$${row * columns.length + column + 1}`).join(',')})`,
    );
    await client.query(`INSERT INTO ${table} (${columns.join(',')}) VALUES ${places.join(',')}`, values);
  }
}
