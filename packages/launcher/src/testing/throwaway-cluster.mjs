import { readdirSync } from 'node:fs';
import { migrate, seed } from '../database.mjs';
import { onEnd } from '../lifecycle.mjs';
import { discardCluster, throwaway } from '../postgres/cluster.mjs';
import { remakeDatabase } from '../postgres/databases.mjs';
import { prepareCluster } from '../preparation.mjs';
import { startOf } from '../processes.mjs';
import { step } from '../steps.mjs';

export const templateName = 'linkfell_template';

const nameOf = (kind) => `${kind}-cluster-${process.pid}-${startOf(process.pid)}`;

/** The data folders among `names` whose run is over: their process is gone, or its pid is another's by now. */
export function leftovers(kind, names, began = startOf) {
  return names.filter((name) => {
    const match = new RegExp(`^${kind}-cluster-(\\d+)-(\\d+)$`).exec(name);
    return match !== null && began(match[1]) !== match[2];
  });
}

/**
 * A cluster for one run, with a database that is migrated and holds the demo data, to copy from. Several runs may
 * go at once; each has its own cluster, and what killed runs left is swept away.
 * @param {'test' | 'bench'} kind
 * @param {object} [options]
 * @param {boolean} [options.safe] with the durability of a real cluster, for measurements
 * @param {boolean} [options.keep] one that stays up after the run, and is taken over by the next one that keeps
 */
export async function prepareTemplate(kind, { safe = false, keep = false } = {}) {
  const settings = safe ? ['max_connections=300'] : throwaway;
  const cluster = await prepareCluster(keep ? `${kind}-cluster` : nameOf(kind), { settings, keep });
  for (const name of leftovers(kind, readdirSync(cluster.home))) await discardCluster(cluster.home, name);
  if (!keep) onEnd(() => discardCluster(cluster.home, nameOf(kind)));
  await step('Template database', async () => {
    const url = await remakeDatabase(cluster, templateName);
    await migrate(url);
    await seed(url);
    return templateName;
  });
  return { TEST_DATABASE_ADMIN_URL: cluster.adminUrl, TEST_TEMPLATE_DB: templateName };
}
