import { databaseUrl, psql } from './psql.mjs';

const ownerRole = 'linkfell';

/**
 * Makes sure of the application's role and its database. The role owns the database and is no superuser, so the
 * application has no more rights here than it would be given elsewhere.
 * @returns {Promise<string>} the application's connection URL
 */
export async function ensureDatabase(cluster, database) {
  const { postgres, adminUrl, secrets, port } = cluster;
  const found = await psql(
    postgres,
    adminUrl,
    `select (select count(*) from pg_roles where rolname = '${ownerRole}'),
            (select count(*) from pg_database where datname = '${database}')`,
  );
  const [roles, databases] = found.split('|').map(Number);
  const password = secrets.ownerPassword;
  if (!roles) await psql(postgres, adminUrl, `create role ${ownerRole} login password '${password}'`);
  if (!databases) await psql(postgres, adminUrl, `create database ${database} owner ${ownerRole}`);
  return databaseUrl({ role: ownerRole, password, port, database });
}

/** Makes an empty database, dropping one of the same name. */
export async function remakeDatabase(cluster, database) {
  const { postgres, adminUrl } = cluster;
  await psql(postgres, adminUrl, `drop database if exists ${database} with (force)`);
  await psql(postgres, adminUrl, `create database ${database}`);
  return cluster.url(database);
}
